// Tonight's passes: what was poured, then what is still planned.
import type { PouredPass } from '@/db/queries/floods'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { PlannedPass } from '@/lib/advice/types'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import type { judgeOwnPasses } from './own-passes'

type Plan = Pick<NonNullable<TonightView['outlook']>, 'passes' | 'ownPlan'>

/** What was poured first, then what is still planned: the keeper's own plan where there is one. */
export function passesOf(
  rink: RinkForJudging,
  poured: readonly PouredPass[],
  own: Awaited<ReturnType<typeof judgeOwnPasses>>,
  planned: readonly PlannedPass[],
  judgedAt: Date,
): Plan {
  const numbers = numbersOf(poured)
  const done = poured.map((flood, index) => pouredView(rink, flood, numbers[index] as number))
  const isPoured = ({ number }: TonightPass) => numbers.includes(number)
  // A plan made before a pass was poured still holds it.
  const known = done.filter(({ startsAt }) => Date.parse(startsAt) <= judgedAt.getTime())
  const last = Math.max(0, ...known.map(({ number }) => number))
  const open = own ? own.passes : advisedPasses(rink, planned, last)
  return { passes: [...done, ...open.filter((pass) => !isPoured(pass))], ownPlan: own && { by: own.by } }
}

/** A check-off keeps the number of its pass; a flood that was only logged takes the first one free. */
function numbersOf(poured: readonly PouredPass[]): number[] {
  const taken = new Set(poured.map(({ passNumber }) => passNumber))
  return poured.map(({ passNumber }) => {
    if (passNumber !== null) return passNumber
    let free = 1
    while (taken.has(free)) free += 1
    taken.add(free)
    return free
  })
}

function pouredView({ water }: RinkForJudging, flood: PouredPass, number: number): TonightPass {
  const at = flood.pouredAt.toISOString()
  const saidSetByAt = flood.saidSetByAt?.toISOString() ?? null
  return {
    number,
    startsAt: at,
    setBy: saidSetByAt ?? at,
    layerMm: flood.layerMm,
    waterL: flood.waterL,
    hoseMinutes: 0,
    temperatureC: flood.waterTemperatureC,
    flowLPerMin: water.flowLPerMin,
    warnings: [],
    limits: [],
    poured: {
      at,
      by: flood.by,
      entry: { id: flood.id, version: flood.version },
      saidSetByAt,
      outcome: flood.outcome,
      outcomeAt: flood.outcomeAt?.toISOString() ?? null,
    },
  }
}

/** Numbered on from the last that was poured. */
function advisedPasses(
  { water: { temperatureC, flowLPerMin } }: RinkForJudging,
  planned: readonly PlannedPass[],
  last: number,
): TonightPass[] {
  return planned.map((pass, index) => ({
    ...pass,
    number: last + index + 1,
    temperatureC,
    flowLPerMin,
    warnings: [],
    limits: [],
    poured: null,
  }))
}
