// The round button of a pass. A form, so that it works before any script; with script the list changes at once.
'use client'
import { useActionState, type FormEvent } from 'react'
import { IDLE } from '@/lib/http/form-state'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { markPassAction } from '../actions'
import type { CheckOffs } from './use-check-offs'
import type { ChangeView } from './use-tonight'

interface CheckOffProps {
  view: TonightView
  pass: TonightPass
  change: ChangeView
  checkOffs: CheckOffs
  onFault: (message: string | null) => void
}

export function CheckOff({ view, pass, change, checkOffs, onFault }: CheckOffProps) {
  const [state, submitWithoutScript] = useActionState(markPassAction, IDLE)
  const isPoured = pass.poured !== null

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const fields = new FormData(event.currentTarget)
    onFault(null)
    if (!isPoured) return onFault(await checkOffs.checkOff(pass))
    if (await checkOffs.takeBack(pass.number)) return
    onFault(await change(() => markPassAction(IDLE, fields), withoutPour(view, pass.number)))
  }

  const fields = {
    rinkId: view.rink.id,
    nightDate: view.night.date,
    passNumber: pass.number,
    layerMm: pass.layerMm,
    waterTemperatureC: pass.temperatureC,
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

function withoutPour(view: TonightView, number: number): TonightView {
  if (!view.outlook) return view
  const passes = view.outlook.passes.map((pass) => (pass.number === number ? { ...pass, poured: null } : pass))
  return { ...view, outlook: { ...view.outlook, passes } }
}
