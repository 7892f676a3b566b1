// `npm run bench:advice`: what the advice is worth on measured winters, beside the thermometer rule. With --json, as JSON.
import {
  calibration,
  chooseLeastShare,
  followAdvice,
  followHourly,
  scoreChoices,
  thermometerRule,
  trueNights,
  withLeastShare,
} from '@/tests/support/advice-bench'
import type { BenchChoice, BenchScore, CalibrationRow } from '@/tests/support/advice-bench'
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

function measure(): {
  nights: number
  good: number
  seconds: number
  rows: Row[]
  heldOut: HeldOut[]
  calibration: CalibrationRow[]
} {
  const start = performance.now()
  const nights = WINTERS.flatMap(([from, to]) => trueNights(from, to))
  const rows: Row[] = RULES_C.map((limitC) => {
    return { strategy: `air at 20:00 at or below ${limitC} °C`, ...scoreChoices(thermometerRule(nights, limitC)) }
  })
  rows.push({ strategy: 'Nightsheet, perfect forecasts', ...scoreChoices(followAdvice(nights, null)) })
  const degraded = SEEDS.flatMap((seed) => followAdvice(nights, seed))
  rows.push({ strategy: 'Nightsheet, degraded, told once, 15:30', ...scoreChoices(degraded) })
  const hourly = SEEDS.flatMap((seed) => followHourly(nights, seed))
  rows.push({ strategy: 'Nightsheet, degraded, re-read hourly', ...scoreChoices(hourly) })
  return {
    nights: nights.length,
    good: nights.filter((night) => night.isGood()).length,
    seconds: Math.round((performance.now() - start) / 1000),
    rows,
    heldOut: holdOut(degraded),
    calibration: calibration(degraded),
  }
}

/** The least share of runs chosen on two winters and tried on the third: what the choice is worth on nights it has not seen. */
interface HeldOut extends BenchScore {
  winter: string
  least: number | null
}

function holdOut(choices: readonly BenchChoice[]): HeldOut[] {
  const isIn = (index: number) => {
    const [from, to] = WINTERS[index] ?? WINTERS[0]
    return ({ night }: BenchChoice) => night.date >= from && night.date <= to
  }
  const tried = WINTERS.map((_, index) => {
    const least = chooseLeastShare(choices.filter((choice) => !isIn(index)(choice)))
    return { least, choices: withLeastShare(choices.filter(isIn(index)), least) }
  })
  const rows: HeldOut[] = tried.map((one, index) => ({
    winter: `${WINTERS[index]?.[0].slice(0, 4)}-${WINTERS[index]?.[1].slice(2, 4)}`,
    least: one.least,
    ...scoreChoices(one.choices),
  }))
  return [...rows, { winter: 'all three', least: null, ...scoreChoices(tried.flatMap((one) => one.choices)) }]
}

const percent = (share: number) => `${(100 * share).toFixed(1)} %`.padStart(8)

function print(result: ReturnType<typeof measure>): void {
  const lines = [
    `${result.nights} nights (Jokioinen, December to February 2013-16), ${result.good} of them good; ${result.seconds} s`,
    `${'strategy'.padEnd(40)}    used  spoiled  floods`,
    ...result.rows.map(({ strategy, used, spoiled, floods }) => {
      return `${strategy.padEnd(40)}${percent(used)} ${percent(spoiled)} ${String(floods).padStart(7)}`
    }),
    `degraded: ${SEEDS.length} draws of the error model; too cold for the hose on ${result.rows[0]?.tooColdForHose ?? 0} good nights`,
    'least share of runs chosen on two winters, tried on the third, told once',
    ...result.heldOut.map(({ winter, least, used, spoiled, floods }) => {
      const label = `${winter}${least === null ? '' : `, at ${least.toFixed(2)}`}`
      return `${label.padEnd(40)}${percent(used)} ${percent(spoiled)} ${String(floods).padStart(7)}`
    }),
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
