// What a move makes of the plan: the pass changed, and every pass of the night judged anew.
import { judgePasses } from '@/lib/advice/move-pass'
import type { NightRun } from '@/lib/advice/night-model'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import { MEASURES } from '@/lib/schemas/measures'
import type { MovableNight, TonightPass, TonightView, WaterChoice } from '@/lib/schemas/tonight-view'

const STEP = 15 * MINUTE_MILLIS
const LAYER_STEP_MM = 0.5

export type Move = { minutes: number } | { layerMm: number } | { water: WaterChoice }

interface MoveInput {
  night: NightRun
  movable: Pick<MovableNight, 'areaM2'>
  passes: TonightPass[]
  number: number
  by: Move
}

export function movePass({ night, movable, passes, number, by }: MoveInput): TonightPass[] {
  const moved = passes.map((pass) => (pass.number === number ? withMove(pass, by, movable.areaM2) : pass))
  const open = moved.filter((pass) => !pass.poured)
  const judged = judgePasses(night, open)
  return moved.map((pass) => {
    const at = open.indexOf(pass)
    if (at < 0) return pass
    const one = judged[at]
    return { ...pass, setBy: one?.setBy ?? null, warnings: one?.warnings ?? [], limits: one?.limits ?? [] }
  })
}

function withMove(pass: TonightPass, by: Move, areaM2: number): TonightPass {
  const layerMm = 'layerMm' in by ? pass.layerMm + by.layerMm : pass.layerMm
  const { temperatureC, flowLPerMin } = 'water' in by ? by.water : pass
  const waterL = layerMm * areaM2
  return {
    ...pass,
    startsAt: 'minutes' in by ? onQuarter(Date.parse(pass.startsAt) + by.minutes * MINUTE_MILLIS) : pass.startsAt,
    layerMm,
    temperatureC,
    flowLPerMin,
    waterL: Math.round(waterL),
    hoseMinutes: Math.ceil(waterL / flowLPerMin),
  }
}

const onQuarter = (at: number) => new Date(Math.round(at / STEP) * STEP).toISOString()

/** Which steps are open to a pass. */
export function stepsOf(pass: TonightPass, { night, readAt }: Pick<TonightView, 'night' | 'readAt'>) {
  const at = Date.parse(pass.startsAt)
  return {
    earlier: at - STEP >= Math.max(Date.parse(night.startsAt), Date.parse(readAt) - STEP),
    later: at + STEP < Date.parse(night.endsAt),
    thinner: pass.layerMm - LAYER_STEP_MM >= MEASURES.layer.least,
    thicker: pass.layerMm + LAYER_STEP_MM <= MEASURES.layer.most,
  }
}
