// The plan as a numbered list: check-off, whether it is set, and for the keeper a way to change each pass.
'use client'
import { useState } from 'react'
import { isGranted } from '@/lib/access/permissions'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { readerOf } from '@/components/rinks/reader'
import { passWarningText } from '@/lib/words/pass'
import { clockText } from '@/lib/words/times'
import { ChangePlan } from './change-plan'
import { CheckOff } from './check-off'
import { OwnPlanNote } from './own-plan-note'
import { passWords, setWords } from './pass-words'
import { PassMover } from './pass-mover-loader'
import { SetQuestion } from './set-question'
import type { CheckOffs } from './use-check-offs'
import type { ChangeView } from './use-tonight'

export interface PlanProps {
  view: TonightView
  /** As the keeper has moved them so far, else as they stand. */
  passes: TonightPass[]
  now: number
  change: ChangeView
  checkOffs: CheckOffs
  onMove: (passes: TonightPass[] | null) => void
}

export function Plan({ view, passes, now, change, checkOffs, onMove }: PlanProps) {
  const [moving, setMoving] = useState<number | null>(null)
  const [fault, setFault] = useState<string | null>(null)
  const mayChange = isGranted(view.viewer.role, 'manage')
  const firstOpen = passes.find(({ poured }) => poured === null)?.number
  const close = () => {
    setMoving(null)
    setFault(null)
    onMove(null)
  }
  return (
    <>
      <OwnPlanNote view={view} change={change} onFault={setFault} />
      <ol className="list-none border-t border-rule p-0">
        {passes.map((pass) => (
          <li key={pass.number} className="border-b border-rule py-[13px]">
            <PassRow view={view} pass={pass} now={now} change={change} checkOffs={checkOffs} onFault={setFault} />
            {moving === pass.number && !pass.poured ? (
              <PassMover view={view} passes={passes} number={pass.number} onMove={onMove} />
            ) : moving !== null && !pass.poured ? (
              <button
                type="button"
                className="min-h-touch cursor-pointer text-note underline print:hidden"
                onClick={() => setMoving(pass.number)}
              >
                Change pass {pass.number}
              </button>
            ) : null}
          </li>
        ))}
      </ol>
      <p role="alert" className="mt-2 text-note text-rust empty:hidden">
        {fault}
      </p>
      {mayChange && firstOpen !== undefined ? (
        <ChangePlan
          view={view}
          passes={passes}
          isChanging={moving !== null}
          change={change}
          onOpen={() => setMoving(firstOpen)}
          onClose={close}
          onFault={setFault}
        />
      ) : null}
    </>
  )
}

type PassRowProps = Omit<PlanProps, 'passes' | 'onMove'> & {
  pass: TonightPass
  onFault: (message: string | null) => void
}

function PassRow({ view, pass, now, change, checkOffs, onFault }: PassRowProps) {
  const reader = readerOf(view)
  const { what, detail } = passWords(pass, view)
  const state = pass.poured ? setWords(pass.poured, now, reader) : ''
  const isWaiting = checkOffs.isStuck(pass.number)
  return (
    <>
      <div className="grid grid-cols-[92px_1fr_auto] items-center gap-x-3.5">
        <span className="text-lead font-semibold tracking-tight">
          {clockText(pass.poured?.at ?? pass.startsAt, reader)}
        </span>
        <span className="leading-[1.35]">
          {what}
          <span className="block text-note text-graphite">{detail}</span>
          {state ? <span className="block text-note">{state}</span> : null}
          {isWaiting ? <span className="block text-note text-rust">Waiting to be sent from this device.</span> : null}
        </span>
        {isGranted(view.viewer.role, 'writeLog') ? (
          <CheckOff view={view} pass={pass} change={change} checkOffs={checkOffs} onFault={onFault} />
        ) : null}
      </div>
      <PassWarnings pass={pass} view={view} />
      {pass.poured ? (
        <SetQuestion view={view} poured={pass.poured} number={pass.number} now={now} change={change} />
      ) : null}
    </>
  )
}

/** Limits of the ice and of the person are told apart: neither makes up for the other. */
function PassWarnings({ pass, view }: { pass: TonightPass; view: TonightView }) {
  const reader = readerOf(view)
  if (pass.poured || pass.warnings.length + pass.limits.length === 0) return null
  return (
    <ul className="mt-1.5 list-none border-l-[3px] border-rust p-0 pl-3.5 text-note">
      {pass.warnings.map((warning) => (
        <li key={warning.code}>{passWarningText(warning, reader)}</li>
      ))}
      {pass.limits.map((limit) => (
        <li key={limit.code}>
          <b className="font-medium">For you:</b> {passWarningText(limit, reader)}
        </li>
      ))}
    </ul>
  )
}
