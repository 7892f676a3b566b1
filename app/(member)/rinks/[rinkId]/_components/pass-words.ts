// What to do in a pass, and the line below it.
import { clockTime, rainText, readerOf, waterText } from '@/components/rinks/quantities'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'

export function passWords(pass: TonightPass, view: TonightView): { what: string; detail: string } {
  const reader = readerOf(view)
  const what = `${rainText(pass.layerMm, reader)} over the whole sheet`
  const water = waterText(pass.waterL, reader)
  if (pass.poured)
    return { what, detail: [water, pass.poured.by ? `poured by ${pass.poured.by}` : 'poured'].join(', ') }
  return {
    what,
    detail: `${water}, ${Math.round(pass.hoseMinutes)} min of hose; set by ${clockTime(pass.setBy, reader)}`,
  }
}
