// What this device kept without a network and the server then would not take, with its reason.
import { readerOf } from '@/components/rinks/reader'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { clockText } from '@/lib/words/times'
import type { CheckOffs } from './use-check-offs'

export function RefusedCheckOffs({ view, checkOffs }: { view: TonightView; checkOffs: CheckOffs }) {
  const reader = readerOf(view)
  return checkOffs.refused.map(({ entryKey, passNumber, pouredAt, refused }) => (
    <Notice key={entryKey} tone="caution" live>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <p>
          Pass {passNumber}, checked off here at {clockText(pouredAt, reader)}, was not logged: {refused}
        </p>
        <Button onClick={() => checkOffs.dismiss(entryKey)}>Got it</Button>
      </div>
    </Notice>
  ))
}
