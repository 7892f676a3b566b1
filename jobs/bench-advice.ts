// `npm run bench:advice`: what the advice is worth on measured winters, beside the thermometer rule. With --json, as JSON.
import {
  calibration,
  followAdvice,
  followHourly,
  scoreChoices,
  thermometerRule,
  trueNights,
} from '@/tests/support/advice-bench'
import type { BenchScore, CalibrationRow } from '@/tests/support/advice-bench'
import { hasMeasuredWinters } from '@/tests/support/measured-winters'

const WINTERS = [
  ['2013-12-01', '2014-02-28'],
  ['2014-12-01', '2015-02-28'],
  ['2015-12-01', '2016-02-29'],
] as const
const RULES_C = [-2, -4, -5, -7]
const SEEDS = [1, 2, 3, 4, 5, 6]

interface Row extends BenchScore {
  strategy: string
}

function measure(): { nights: number; good: number; seconds: number; rows: Row[]; calibration: CalibrationRow[] } {
  const start = performance.now()
  const nights = WINTERS.flatMap(([from, to]) => trueNights(from, to))
  const rows: Row[] = RULES_C.map((limitC) => {
    return { strategy: `air at 20:00 at or below ${limitC} °C`, ...scoreChoices(thermometerRule(nights, limitC)) }
  })
  rows.push({ strategy: 'Nightsheet, perfect forecasts', ...scoreChoices(followAdvice(nights, null)) })
  const degraded = SEEDS.flatMap((seed) => followAdvice(nights, seed))
  rows.push({ strategy: 'Nightsheet, degraded, told at 15:30', ...scoreChoices(degraded) })
  const hourly = SEEDS.flatMap((seed) => followHourly(nights, seed))
  rows.push({ strategy: 'Nightsheet, degraded, hour by hour', ...scoreChoices(hourly) })
  return {
    nights: nights.length,
    good: nights.filter((night) => night.isGood).length,
    seconds: Math.round((performance.now() - start) / 1000),
    rows,
    calibration: calibration(degraded),
  }
}

const percent = (share: number) => `${(100 * share).toFixed(1)} %`.padStart(8)

function print(result: ReturnType<typeof measure>): void {
  const lines = [
    `${result.nights} nights (Jokioinen, December to February 2013-16), ${result.good} of them good; ${result.seconds} s`,
    `${'strategy'.padEnd(36)}    used  spoiled  floods`,
    ...result.rows.map(({ strategy, used, spoiled, floods }) => {
      return `${strategy.padEnd(36)}${percent(used)} ${percent(spoiled)} ${String(floods).padStart(7)}`
    }),
    `degraded: ${SEEDS.length} draws of the error model; too cold for the hose on ${result.rows[0]?.tooColdForHose ?? 0} good nights`,
    'agreement told at 15:30, and nights that were good',
    ...result.calibration.map(({ from, to, nights, good }) => {
      const range = from === 1 ? 'all runs' : `${from.toFixed(1)} to ${to.toFixed(1)}`
      return `${range.padEnd(11)} ${String(nights).padStart(7)} ${nights > 0 ? percent(good / nights) : ''}`
    }),
  ]
  process.stdout.write(`${lines.join('\n')}\n`)
}

if (!hasMeasuredWinters) {
  process.stdout.write('The measured winters are not here (../shared/data): nothing to measure.\n')
} else if (process.argv.includes('--json')) {
  process.stdout.write(`${JSON.stringify(measure(), null, 2)}\n`)
} else {
  print(measure())
}
