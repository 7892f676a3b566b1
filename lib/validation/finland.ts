// Three Finnish lakes: the fall-back from daily mean temperatures and snow against drilled ice.
import { readDocument } from './measured'
import { stefanThicknessM, ashtonThicknessM, thicknessFromDaysM } from '@/lib/physics/stefan'
import { summarise, type ValidationLine } from './scores'

interface Interval {
  ice_start_m: number
  ice_end_m: number
  snow_start_m: number | null
  snow_end_m: number | null
  daily_mean_air_c: number[]
}

/** Intervals by mean snow on the ice. */
export function validateFinland(): ValidationLine[] {
  const intervals = readDocument<Interval[]>('finland/intervals_daily.json').filter(
    (one) => one.snow_start_m !== null && one.snow_end_m !== null,
  )
  const bySnow = (from: number, to: number) =>
    intervals.filter((one) => {
      const meanM = (one.snow_start_m! + one.snow_end_m!) / 2
      return meanM > from && meanM <= to
    })
  return [
    line(
      'Finland daily, snow ≤ 3 cm',
      bySnow(-1, 0.03),
      'bias ±1.2, RMSE 4.2',
      (bias, rmse) => Math.abs(bias) <= 1.2 && rmse <= 4.2,
    ),
    line('Finland daily, snow 3-10 cm', bySnow(0.03, 0.1), 'none', () => true),
  ]
}

function line(
  set: string,
  some: Interval[],
  bar: string,
  isMet: (bias: number, rmse: number) => boolean,
): ValidationLine {
  const errors = (predict: (one: Interval) => number) =>
    summarise(some.map((one) => (predict(one) - one.ice_end_m) * 100))
  const frost = (one: Interval) => one.daily_mean_air_c.reduce((sum, airC) => sum + Math.max(0, -airC), 0)
  const model = errors((one) => thicknessFromDaysM(one.ice_start_m, daysOf(one)))
  return {
    set,
    unit: 'cm',
    model,
    others: {
      Stefan: errors((one) => stefanThicknessM(one.ice_start_m, frost(one))),
      'Ashton 20': errors((one) => ashtonThicknessM(one.ice_start_m, frost(one), 20)),
    },
    bar,
    isMet: isMet(model.bias, model.rmse),
  }
}

function daysOf(one: Interval): { airC: number; snowM: number }[] {
  const count = one.daily_mean_air_c.length
  return one.daily_mean_air_c.map((airC, day) => ({
    airC,
    snowM: one.snow_start_m! + ((one.snow_end_m! - one.snow_start_m!) * (day + 0.5)) / count,
  }))
}
