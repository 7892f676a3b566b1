// Why the page may be behind, and what to do: a bar at the lower edge, so that nothing moves under a finger when it comes.
'use client'
import Link from 'next/link'
import { ageText, readerOf } from '@/components/rinks/reader'
import { Button } from '@/components/ui/button'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { clockText } from '@/lib/words/times'
import { unbroken } from '@/lib/words/unbroken'
import type { ReadTrouble } from './use-tonight'

type Trouble = NonNullable<ReadTrouble>

const WHAT: Record<Trouble, string> = {
  offline: 'No connection.',
  failed: 'The newest state could not be read; we keep trying.',
  'signed-out': 'You are signed out on this device.',
  gone: 'You are no longer on this rink’s list, or the rink was removed.',
}

interface TroubleBarProps {
  view: TonightView
  now: number
  trouble: Trouble
  onReadAgain: () => void
}

export function TroubleBar({ view, now, trouble, onReadAgain }: TroubleBarProps) {
  return (
    <>
      <div
        role="status"
        className="fixed inset-x-0 bottom-[calc(61px+env(safe-area-inset-bottom))] z-10 border-t border-rule bg-sheet px-5 py-2 text-note lg:bottom-0 lg:left-[164px] lg:px-9 print:static print:border-0 print:p-0"
      >
        <div className="mx-auto flex max-w-page items-center justify-between gap-4">
          <p className="border-l-[3px] border-rust py-0.5 pl-3.5">
            {unbroken(
              `${WHAT[trouble]} As of ${clockText(view.readAt, readerOf(view))}, ${ageText(view.readAt, now)}.`,
            )}
          </p>
          <WayOut trouble={trouble} onReadAgain={onReadAgain} />
        </div>
      </div>
      {/* The end of the page can still be read above the bar. */}
      <div aria-hidden="true" className="h-20 print:hidden" />
    </>
  )
}

function WayOut({ trouble, onReadAgain }: Pick<TroubleBarProps, 'trouble' | 'onReadAgain'>) {
  if (trouble === 'gone') return null
  if (trouble !== 'signed-out') return <Button onClick={onReadAgain}>Read again</Button>
  return (
    <Link href="/sign-in" className="grid min-h-touch shrink-0 place-items-center underline">
      Sign in
    </Link>
  )
}
