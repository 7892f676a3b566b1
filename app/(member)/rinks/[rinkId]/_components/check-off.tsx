// The round button of a pass. A form, so that it works before any script; with script the list changes at once.
'use client'
import type { Route } from 'next'
import Link from 'next/link'
import { useActionState, useRef, useState, type FormEvent } from 'react'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { Button } from '@/components/ui/button'
import { IDLE } from '@/lib/http/form-state'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { markPassAction } from '../actions'
import type { CheckOffs } from './use-check-offs'
import type { ChangeView } from './use-tonight'
import { hasMoreToLose } from './when-asked'

const ROUND = 'grid h-12 w-12 cursor-pointer place-items-center rounded-full border-[1.5px] border-ink'

interface CheckOffProps {
  view: TonightView
  pass: TonightPass
  change: ChangeView
  checkOffs: CheckOffs
  onFault: (message: string | null) => void
}

export function CheckOff({ view, pass, change, checkOffs, onFault }: CheckOffProps) {
  const [state, submitWithoutScript] = useActionState(markPassAction, IDLE)
  const [isAsking, setIsAsking] = useState(false)
  const button = useRef<HTMLButtonElement>(null)
  const isHydrated = useHydrated()
  const isPoured = pass.poured !== null
  const asksFirst = pass.poured !== null && hasMoreToLose(pass.poured)

  const fields = {
    rinkId: view.rink.id,
    nightDate: view.night.date,
    passNumber: pass.number,
    layerMm: pass.layerMm,
    waterTemperatureC: pass.temperatureC,
    isPoured: isPoured ? 'no' : 'yes',
  }

  async function takeOut() {
    onFault(null)
    if (await checkOffs.takeBack(pass.number)) return
    onFault(await change(() => markPassAction(IDLE, formDataOf(fields)), withoutPour(view, pass.number)))
  }

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    if (asksFirst) return setIsAsking(!isAsking)
    if (isPoured) return takeOut()
    onFault(null)
    onFault(await checkOffs.checkOff(pass))
  }

  async function answer(isYes: boolean) {
    setIsAsking(false)
    button.current?.focus()
    if (isYes) await takeOut()
  }

  if (asksFirst && !isHydrated) return <ToItsEntry view={view} pass={pass} />
  return (
    <>
      <form action={submitWithoutScript} onSubmit={submit} className="print:hidden">
        {Object.entries(fields).map(([name, value]) => (
          <input key={name} type="hidden" name={name} value={value} />
        ))}
        <button
          ref={button}
          type="submit"
          aria-pressed={isPoured}
          aria-label={`Pass ${pass.number} is poured`}
          className={`${ROUND} text-ink aria-pressed:bg-ink aria-pressed:text-paper`}
        >
          <Tick />
        </button>
        {state.status === 'error' ? <p className="mt-1 text-note text-rust">{state.message}</p> : null}
      </form>
      {isAsking && isPoured ? <TakeOutQuestion number={pass.number} onAnswer={answer} /> : null}
    </>
  )
}

/** Before any script nothing can be asked in place: the entry's own page asks. */
function ToItsEntry({ view, pass: { number, poured } }: Pick<CheckOffProps, 'view' | 'pass'>) {
  const entry = poured?.entry ? `/${poured.entry.id}` : ''
  return (
    <Link
      href={`/rinks/${view.rink.id}/log${entry}` as Route}
      prefetch={false}
      aria-label={`Pass ${number} is poured: open it in the log`}
      className={`${ROUND} bg-ink text-paper print:hidden`}
    >
      <Tick />
    </Link>
  )
}

function Tick() {
  return (
    <svg viewBox="0 0 20 20" width={20} height={20} aria-hidden="true">
      <path d="M4,10.5 l4,4 l8,-9" fill="none" stroke="currentColor" strokeWidth={2} />
    </svg>
  )
}

interface TakeOutQuestionProps {
  number: number
  onAnswer: (isYes: boolean) => void
}

/** Below the pass, across its whole row. */
function TakeOutQuestion({ number, onAnswer }: TakeOutQuestionProps) {
  const id = `take-out-${number}`
  return (
    <div
      role="group"
      aria-labelledby={id}
      className="col-span-3 mt-2 print:hidden"
      onKeyDown={({ key }) => (key === 'Escape' ? onAnswer(false) : undefined)}
    >
      <p id={id} className="font-medium">
        Take this pass out of the log?
      </p>
      <p className="text-note text-graphite">What was found or changed since goes with it.</p>
      <div className="mt-1 flex flex-wrap gap-3">
        <Button onClick={() => onAnswer(true)}>Yes, take it out</Button>
        <Button autoFocus onClick={() => onAnswer(false)}>
          No, leave it
        </Button>
      </div>
    </div>
  )
}

function formDataOf(fields: Record<string, string | number>): FormData {
  const data = new FormData()
  for (const [name, value] of Object.entries(fields)) data.set(name, String(value))
  return data
}

function withoutPour(view: TonightView, number: number): TonightView {
  if (!view.outlook) return view
  const passes = view.outlook.passes.map((pass) => (pass.number === number ? { ...pass, poured: null } : pass))
  return { ...view, outlook: { ...view.outlook, passes } }
}
