// `npm run bench`: how long a week takes to be judged, with one forecast run and with many, and the plain column beside it.
import { judge } from '@/lib/advice/judge'
import { AGREEMENT } from '@/lib/advice/thresholds'
import type { JudgeInput } from '@/lib/advice/types'
import { advanceSheet, createSheet, type SheetState } from '@/lib/physics/sheet'
import { explicitMinutesToSet } from '@/tests/support/explicit-column'
import { minutesToSet } from '@/lib/physics/layer'
import { prepareHours } from '@/lib/physics/prepare'
import { freezeRateMmPerH, wetSurfaceBalance } from '@/lib/physics/balance'
import { windChillC } from '@/lib/physics/wind-chill'
import type { HourlyRecord, PreparedHour } from '@/lib/physics/types'

const HOURS = 168
const MEMBERS = 31
const SITE = { latitudeDeg: 45.9, longitudeDeg: -77.3, shelter: 0.6, skyView: 0.85 }
const LAYER = { layerMm: 3, temperatureC: 6 }
const SHEET = { thicknessMm: 90, temperatureC: -4, snowCoverCm: 0, base: 'liner' as const }

/** A winter week with day and night, a cold and a mild spell; each run a little apart from the others. */
function weekOfWeather(run: number): HourlyRecord[] {
  return Array.from({ length: HOURS }, (_, hour) => {
    const airTemperatureC = -6 + 5 * Math.sin((hour / 24) * 2 * Math.PI) + 5 * Math.sin(hour / 25 + run / 10) + run / 20
    return {
      time: new Date(Date.UTC(2027, 0, 12, 17 + hour)).toISOString(),
      airTemperatureC,
      dewPointC: airTemperatureC - 3,
      windSpeedMps: 3 + 2 * Math.sin(hour / 7 + run),
      windGustMps: null,
      cloudCover: 0.5 + 0.5 * Math.sin(hour / 9 + run),
      shortwaveWm2: null,
      precipitationMm: 0,
      rainMm: 0,
      snowfallCm: 0,
      pressureHpa: 1010,
    }
  })
}

/** A rink that is looked after every evening, at the start of the week. */
function inputOf(hours: HourlyRecord[], runs?: HourlyRecord[][]): JudgeInput {
  const { latitudeDeg, longitudeDeg, skyView } = SITE
  return {
    now: '2027-01-12T21:42:00Z',
    rink: {
      latitude: latitudeDeg,
      longitude: longitudeDeg,
      timeZone: 'America/Toronto',
      lengthM: 10,
      widthM: 10,
      shelter: 'suburban',
      skyView,
      base: 'liner',
      phase: 'skating',
    },
    water: { ...LAYER, flowLPerMin: 25, fillDepthMm: 120 },
    sheet: SHEET,
    available: [{ from: '17:00', to: '01:00' }],
    maxPasses: 3,
    hours,
    ...(runs ? { members: runs } : {}),
  }
}

/** Everything the physics does for a score of one run: balance, wind chill, sheet, and the set time of a layer at each hour. */
function scoreRun(records: HourlyRecord[]): { states: SheetState[]; hours: PreparedHour[]; sum: number } {
  const hours = prepareHours(records, SITE)
  const states: SheetState[] = []
  let state = createSheet(SHEET)
  let sum = 0
  for (let i = 0; i < hours.length; i++) {
    const hour = hours[i]!
    states.push(state)
    sum += freezeRateMmPerH(wetSurfaceBalance(hour).netWm2) + windChillC(hour.airTemperatureC, hour.windSpeedMps)
    sum += minutesToSet(state, hours, i, 0, LAYER) ?? 0
    state = advanceSheet(state, hour)
  }
  return { states, hours, sum }
}

/** The same set times by the plain column; only every so many hours, scaled up, as it is slow. */
function explicitMillis(states: SheetState[], hours: PreparedHour[], every: number): number {
  const start = performance.now()
  for (let i = 0; i < HOURS - 24; i += every) {
    explicitMinutesToSet({
      sheet: [{ thicknessMm: SHEET.thicknessMm, temperatureC: Math.min(-0.1, states[i]!.surfaceTemperatureC / 2) }],
      layer: LAYER,
      hours: hours.slice(i, i + 24),
      groundWm2: 5,
    })
  }
  return (performance.now() - start) * every
}

/** Median of the clock, and the processor's time a round: on a machine with other work they part. */
function timed(rounds: number, run: () => void): { medianMs: number; cpuMs: number } {
  const before = process.cpuUsage()
  const times = Array.from({ length: rounds }, () => {
    const start = performance.now()
    run()
    return performance.now() - start
  })
  const used = process.cpuUsage(before)
  const medianMs = times.sort((a, b) => a - b)[Math.floor(rounds / 2)]!
  return { medianMs, cpuMs: (used.user + used.system) / 1000 / rounds }
}

const week = weekOfWeather(0)
const members = Array.from({ length: MEMBERS }, (_, run) => weekOfWeather(run))
timed(100, () => scoreRun(week))
timed(200, () => judge(inputOf(week), { runs: 0 }))
const oneRun = timed(300, () => judge(inputOf(week), { runs: 0 }))
const allMembers = timed(30, () => judge(inputOf(week, members)))
const perturbed = timed(30, () => judge(inputOf(week)))
const physics = timed(200, () => scoreRun(week))
const { states, hours } = scoreRun(week)
const explicitMs = explicitMillis(states, hours, 6)
const rows = [
  { what: 'judge() of 168 hours, one run', ...oneRun, barMs: 3 },
  { what: `judge() of 168 hours, ${MEMBERS} members`, ...allMembers, barMs: 60 },
  { what: `judge() of 168 hours, ${AGREEMENT.defaultRuns} perturbed runs`, ...perturbed, barMs: null },
  { what: 'physics alone of 168 hours, one run', ...physics, barMs: null },
  { what: 'set times alone by the 1 mm explicit column', medianMs: explicitMs, cpuMs: null, barMs: null },
]
const timesFaster = explicitMs / oneRun.medianMs

if (process.argv.includes('--json')) {
  console.log(JSON.stringify({ rows, timesFaster }, null, 2))
} else {
  console.log(`${''.padEnd(46)}${'median ms'.padStart(12)}${'cpu ms'.padStart(10)}${'bar'.padStart(8)}`)
  for (const { what, medianMs, cpuMs, barMs } of rows) {
    const cells = [
      medianMs.toFixed(2).padStart(12),
      (cpuMs?.toFixed(2) ?? '').padStart(10),
      String(barMs ?? '').padStart(8),
    ]
    console.log(what.padEnd(46) + cells.join(''))
  }
  console.log(
    `${'times faster than the explicit column'.padEnd(46)}${timesFaster.toFixed(0).padStart(12)}${'20'.padStart(18)}`,
  )
}
