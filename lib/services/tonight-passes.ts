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
  const done = poured.map((flood, index) => pouredView(rink, flood, index))
  const isPoured = ({ number }: TonightPass) => done.some((pass) => pass.number === number)
  const open = own ? own.passes : advisedPasses(rink, poured, planned, judgedAt)
  return { passes: [...done, ...open.filter((pass) => !isPoured(pass))], ownPlan: own && { by: own.by } }
}

function pouredView({ water }: RinkForJudging, flood: PouredPass, index: number): TonightPass {
  const at = flood.pouredAt.toISOString()
  const saidSetByAt = flood.saidSetByAt?.toISOString() ?? null
  return {
    number: flood.passNumber ?? index + 1,
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

/** Numbered on from what was poured. A plan made before a pass was poured still holds it. */
function advisedPasses(
  { water }: RinkForJudging,
  poured: readonly PouredPass[],
  planned: readonly PlannedPass[],
  judgedAt: Date,
): TonightPass[] {
  const known = poured.flatMap(({ passNumber, pouredAt }, index) =>
    pouredAt <= judgedAt ? [passNumber ?? index + 1] : [],
  )
  const last = Math.max(0, ...known)
  const { temperatureC, flowLPerMin } = water
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
