// One row type per table, and Knex's map of them. Instants are Date, nights are text, ids are strings.
import type { Knex } from 'knex'
import type { Role } from '@/lib/access/permissions'
import type { Units } from '@/lib/units'

export interface UserRow {
  id: string
  email: string
  name: string
  password_hash: string | null
  email_verified_at: Date | null
  email_refused_at: Date | null
  is_admin: boolean
  unit_temperature: Units['temperature']
  unit_ice: Units['ice']
  unit_water: Units['water']
  unit_size: Units['size']
  unit_wind: Units['wind']
  clock: '12' | '24'
  theme: 'system' | 'light' | 'dark' | 'dark-after-sunset'
  deletion_due_at: Date | null
  created_at: Date
  updated_at: Date
}

export interface SessionRow {
  token_hash: string
  user_id: string
  created_at: Date
  expires_at: Date
  device: string
  last_seen_at: Date
}

export interface AccountLinkRow {
  id: string
  user_id: string
  purpose: 'verify' | 'sign-in' | 'reset' | 'change-email'
  new_email: string | null
  created_at: Date
  expires_at: Date
  used_at: Date | null
}

export interface RateLimitRow {
  key: string
  window_starts_at: Date
  hits: number
}

export interface GridCellRow {
  id: string
  latitude_deg: number
  longitude_deg: number
  last_tried_at: Date | null
  last_error: string | null
  retry_at: Date | null
}

export interface RinkRow {
  id: string
  name: string
  place_name: string
  latitude_deg: number
  longitude_deg: number
  grid_cell_id: string
  time_zone: string
  time_zone_by: 'place' | 'keeper'
  length_m: number
  width_m: number
  base: 'liner' | 'ground' | 'snow'
  phase: 'planning' | 'waiting' | 'filling' | 'freezing' | 'skating' | 'thaw' | 'closed'
  shelter: 'open' | 'suburban' | 'tight'
  sky_view: number
  max_passes: number
  settings_version: number
  floor: unknown
  board_height_mm: number | null
  carries_skater_mm: number
  wind_limit_mps: number | null
  wind_chill_limit_c: number | null
  water_price_per_m3: number | null
  created_by: string | null
  creation_key: string
  created_at: Date
  updated_at: Date
}

export interface RinkMemberRow {
  rink_id: string
  user_id: string
  role: Role
  joined_at: Date
}

export interface InvitationRow {
  id: string
  rink_id: string
  email: string
  role: Role
  invited_by: string
  created_at: Date
  expires_at: Date
  taken_at: Date | null
  taken_by: string | null
  withdrawn_at: Date | null
}

export interface WaterSourceRow {
  id: string
  rink_id: string
  kind: 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker'
  flow_l_per_min: number
  temperature_c: number
  layer_mm: number
  fill_depth_mm: number
  is_default: boolean
}

export interface AvailableHoursRow {
  id: string
  rink_id: string
  from_local: string
  to_local: string
  weekdays: number[]
}

export interface SheetStateRow {
  rink_id: string
  as_of: Date
  origin: 'reported' | 'modelled'
  model_version: string | null
  thickness_mm: number
  temperature_c: number
  snow_cover_cm: number
  /** The model's own state, opaque to the database; absent when a person reported the sheet. */
  state: unknown
}

export interface LogEntryRow {
  id: string
  rink_id: string
  kind: 'fill' | 'flood' | 'scrape' | 'clear' | 'repair' | 'reading' | 'thaw' | 'note'
  happened_at: Date
  night_date: string
  pass_number: number | null
  layer_mm: number | null
  water_l: number | null
  water_temperature_c: number | null
  water_kind: 'cold-tap' | 'hot-tap' | 'hydrant' | 'tanker' | null
  thickness_mm: number | null
  model_thickness_mm: number | null
  said_set_by_at: Date | null
  outcome: 'set' | 'wet' | 'spoiled' | null
  outcome_at: Date | null
  note: string
  written_by: string | null
  entry_key: string
  version: number
  created_at: Date
  updated_at: Date
  deleted_at: Date | null
}

export interface OwnPassRow {
  rink_id: string
  night_date: string
  pass_number: number
  starts_at: Date
  layer_mm: number
  water_temperature_c: number
  flow_l_per_min: number
  changed_by: string | null
  changed_at: Date
}

export interface LogRevisionRow {
  entry_id: string
  version: number
  was: unknown
  changed_by: string | null
  changed_at: Date
}

export interface FillRow {
  id: string
  rink_id: string
  started_at: Date
  started_by: string | null
  target_depth_mm: number
  finished_at: Date | null
  given_up: boolean
}

export interface FillSessionRow {
  id: string
  fill_id: string
  started_at: Date
  stopped_at: Date | null
  flow_l_per_min: number
}

export interface FillCheckRow {
  id: string
  fill_id: string
  checked_at: Date
  checked_by: string | null
  low_corner_depth_mm: number | null
  note: string
}

export interface NightOutcomeRow {
  rink_id: string
  night_date: string
  said: 'fill' | 'flood' | 'hold'
  window_id: string | null
  starts_at: Date | null
  ends_at: Date | null
  set_by_at: Date | null
  agreement: number | null
  result: 'kept' | 'broken' | 'unknown'
  source: 'report' | 'weather' | 'none'
  detail: unknown
  model_version: string
  settled_at: Date
}

export interface YardReportRow {
  entry_id: string
  rink_id: string
  entry_version: number
  happened_at: Date
  report: unknown
}

export interface YardEstimateRow {
  rink_id: string
  estimated_at: Date
  model_version: string
  is_learned: boolean
  shelter: number
  sky_view: number
  reports: number
  detail: unknown
}

export interface ForecastRow {
  id: string
  grid_cell_id: string
  provider: string
  slot_at: Date
  issued_at: Date | null
  fetched_at: Date
  expires_at: Date
  hours: unknown
  members: unknown
  attribution: unknown
}

export interface OutlookRow {
  id: string
  rink_id: string
  forecast_id: string
  settings_version: number
  model_version: string
  judged_at: Date
  slot_at: Date
  time_zone: string
  night_date: string
  verdict: 'fill' | 'flood' | 'hold' | 'unknown'
  summary: unknown
  advice: unknown
}

export interface ScoredHourRow {
  outlook_id: string
  starts_at: Date
  is_known: boolean
  net_heat_loss_wm2: number | null
  freeze_rate_mm_per_h: number | null
  wind_chill_c: number | null
  sets_at: Date | null
  fill_score: number
  flood_score: number
  hold_score: number
  verdict: 'fill' | 'flood' | 'hold'
  reasons: unknown
  detail: unknown
}

export interface AdvisedWindowRow {
  id: string
  rink_id: string
  night_date: string
  time_zone: string
  kind: 'fill' | 'flood'
  version: number
  state: 'open' | 'closed'
  outlook_id: string | null
  forecast_id: string
  model_version: string
  advised_at: Date
  starts_at: Date | null
  ends_at: Date | null
  latest_start_at: Date | null
  set_by_at: Date | null
  score: number | null
  agreement: number | null
  runs: number | null
  passes: unknown
  closed_reason: unknown
}

export interface AlertPreferenceRow {
  rink_id: string
  user_id: string
  tell_at: string
  wants_email: boolean
  wants_push: boolean
  muted_through: string | null
  updated_at: Date
}

export interface PushSubscriptionRow {
  id: string
  user_id: string
  endpoint: string
  p256dh: string
  auth: string
  created_at: Date
  disabled_at: Date | null
  disabled_reason: string | null
}

export interface MessageRow {
  id: string
  dedupe_key: string
  user_id: string
  rink_id: string | null
  night_date: string | null
  channel: 'email' | 'push'
  kind: string
  content: unknown
  window_id: string | null
  send_at: Date
  expires_at: Date
  state: 'promised' | 'delivered' | 'expired' | 'dead'
  settled_at: Date | null
  created_at: Date
}

export interface DeliveryAttemptRow {
  id: string
  message_id: string
  push_subscription_id: string | null
  attempted_at: Date
  outcome: 'delivered' | 'temporary' | 'permanent'
  error: string | null
}

export interface JobRunRow {
  job: string
  key: string
  last_started_at: Date
  last_succeeded_at: Date | null
  last_failed_at: Date | null
  last_error: string | null
}

/** Inserts may leave out what the database fills in; updates may name any column. */
type Table<Row> = Knex.CompositeTableType<Row, Partial<Row>, Partial<Row>>

declare module 'knex/types/tables.js' {
  interface Tables {
    users: Table<UserRow>
    sessions: Table<SessionRow>
    account_links: Table<AccountLinkRow>
    rate_limits: Table<RateLimitRow>
    grid_cells: Table<GridCellRow>
    rinks: Table<RinkRow>
    rink_members: Table<RinkMemberRow>
    invitations: Table<InvitationRow>
    water_sources: Table<WaterSourceRow>
    available_hours: Table<AvailableHoursRow>
    sheet_states: Table<SheetStateRow>
    log_entries: Table<LogEntryRow>
    log_revisions: Table<LogRevisionRow>
    own_passes: Table<OwnPassRow>
    fills: Table<FillRow>
    fill_sessions: Table<FillSessionRow>
    fill_checks: Table<FillCheckRow>
    night_outcomes: Table<NightOutcomeRow>
    yard_reports: Table<YardReportRow>
    yard_estimates: Table<YardEstimateRow>
    forecasts: Table<ForecastRow>
    outlooks: Table<OutlookRow>
    scored_hours: Table<ScoredHourRow>
    advised_windows: Table<AdvisedWindowRow>
    alert_preferences: Table<AlertPreferenceRow>
    push_subscriptions: Table<PushSubscriptionRow>
    messages: Table<MessageRow>
    delivery_attempts: Table<DeliveryAttemptRow>
    job_runs: Table<JobRunRow>
  }
}
