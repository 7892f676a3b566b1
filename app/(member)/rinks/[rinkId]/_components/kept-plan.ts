// The keeper's own plan until the server has it: what is sent, and what is shown meanwhile.
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'

export function planFields({ rink, night }: TonightView, passes: readonly TonightPass[]): FormData {
  const open = passes.filter(({ poured }) => poured === null)
  const fields = new FormData()
  fields.set('rinkId', rink.id)
  fields.set('nightDate', night.date)
  fields.set(
    'passes',
    JSON.stringify(
      open.map(({ number, startsAt, layerMm, temperatureC, flowLPerMin }) => ({
        number,
        startsAt: new Date(startsAt).toISOString(),
        layerMm,
        temperatureC,
        flowLPerMin,
      })),
    ),
  )
  return fields
}

export function withOwnPlan(view: TonightView, passes: TonightPass[]): TonightView {
  if (!view.outlook) return view
  return { ...view, outlook: { ...view.outlook, passes, ownPlan: { by: null } } }
}

/** Passes as the keeper moves them, with what was checked off meanwhile. */
export function withPoured(moved: TonightPass[], current: readonly TonightPass[]): TonightPass[] {
  return moved.map((pass) => current.find(({ number, poured }) => poured !== null && number === pass.number) ?? pass)
}
