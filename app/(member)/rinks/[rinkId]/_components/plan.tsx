// The plan as a numbered list; a round button checks a pass off, another press takes it back.
'use client'
import { useActionState, useState, type FormEvent } from 'react'
import { isGranted } from '@/lib/access/permissions'
import { IDLE } from '@/lib/http/form-state'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { readerOf } from '@/components/rinks/reader'
import { clockText } from '@/lib/words/times'
import { markPassAction } from '../actions'
import { passWords } from './pass-words'
import type { ChangeView } from './use-tonight'

export function Plan({ view, passes, change }: { view: TonightView; passes: TonightPass[]; change: ChangeView }) {
  const [fault, setFault] = useState<string | null>(null)
  const mayLog = isGranted(view.viewer.role, 'writeLog')
  const reader = readerOf(view)
  return (
    <>
      <ol className="list-none border-t border-rule p-0">
        {passes.map((pass) => {
          const { what, detail } = passWords(pass, view)
          return (
            <li
              key={pass.number}
              className="grid grid-cols-[92px_1fr_auto] items-center gap-x-3.5 border-b border-rule py-[13px]"
            >
              <span className="text-lead font-semibold tracking-tight">
                {clockText(pass.poured?.at ?? pass.startsAt, reader)}
              </span>
              <span className="leading-[1.35]">
                {what}
                <span className="block text-note text-graphite">{detail}</span>
              </span>
              {mayLog ? <CheckOff view={view} pass={pass} change={change} onFault={setFault} /> : null}
            </li>
          )
        })}
      </ol>
      <p role="alert" className="mt-2 text-note text-rust empty:hidden">
        {fault}
      </p>
    </>
  )
}

interface CheckOffProps {
  view: TonightView
  pass: TonightPass
  change: ChangeView
  onFault: (message: string | null) => void
}

/** A form, so that it works before any script; with script the list changes at once, and back when the server refuses. */
function CheckOff({ view, pass, change, onFault }: CheckOffProps) {
  const [state, submitWithoutScript] = useActionState(markPassAction, IDLE)
  const isPoured = pass.poured !== null

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const fields = new FormData(event.currentTarget)
    onFault(null)
    const shown = withPoured(view, pass.number, isPoured ? null : { at: new Date().toISOString(), by: null })
    onFault(await change(() => markPassAction(IDLE, fields), shown))
  }

  const fields = {
    rinkId: view.rink.id,
    nightDate: view.night.date,
    passNumber: pass.number,
    layerMm: pass.layerMm,
    isPoured: isPoured ? 'no' : 'yes',
  }
  return (
    <form action={submitWithoutScript} onSubmit={submit} className="print:hidden">
      {Object.entries(fields).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      <button
        type="submit"
        aria-pressed={isPoured}
        aria-label={`Pass ${pass.number} is poured`}
        className="grid h-12 w-12 cursor-pointer place-items-center rounded-full border-[1.5px] border-ink text-ink aria-pressed:bg-ink aria-pressed:text-paper"
      >
        <svg viewBox="0 0 20 20" width={20} height={20} aria-hidden="true">
          <path d="M4,10.5 l4,4 l8,-9" fill="none" stroke="currentColor" strokeWidth={2} />
        </svg>
      </button>
      {state.status === 'error' ? <p className="mt-1 text-note text-rust">{state.message}</p> : null}
    </form>
  )
}

function withPoured(view: TonightView, number: number, poured: TonightPass['poured']): TonightView {
  if (!view.outlook) return view
  const passes = view.outlook.passes.map((pass) => (pass.number === number ? { ...pass, poured } : pass))
  return { ...view, outlook: { ...view.outlook, passes } }
}
