// What to do in a pass, and the line below it.
import { readerOf } from '@/components/rinks/reader'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { durationText, layerText, waterText } from '@/lib/words/quantities'
import { doneByText } from '@/lib/words/times'

export function passWords(pass: TonightPass, view: TonightView): { what: string; detail: string } {
  const reader = readerOf(view)
  const what = `${layerText(pass.layerMm, reader)} over the whole sheet`
  const water = waterText(pass.waterL, reader)
  if (pass.poured) return { what, detail: `${water}, poured${pass.poured.by ? ` by ${pass.poured.by}` : ''}` }
  return {
    what,
    detail: `${water}, ${durationText(pass.hoseMinutes)} of hose; set by ${doneByText(pass.setBy, reader)}`,
  }
}
