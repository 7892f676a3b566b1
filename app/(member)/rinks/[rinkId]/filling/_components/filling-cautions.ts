// What to mind while a hose runs for hours.
import type { StandingCaution } from '@/components/rinks/standing-cautions'

export const FILLING_CAUTIONS: readonly StandingCaution[] = [
  'backflow',
  'run_off',
  'wet_pavement',
  'electric_leads',
  'not_alone',
]
