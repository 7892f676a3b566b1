// Once a poured pass should be set: is it? The answer goes into the log and teaches the model this yard.
'use client'
import { useActionState, useState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import { isGranted } from '@/lib/access/permissions'
import { IDLE } from '@/lib/http/form-state'
import type { PouredPassView, TonightView } from '@/lib/schemas/tonight-view'
import { answerSetAction } from '../actions'
import { isAsked } from './when-asked'
import type { ChangeView } from './use-tonight'

interface SetQuestionProps {
  view: TonightView
  poured: PouredPassView
  number: number
  now: number
  change: ChangeView
}

export function SetQuestion({ view, poured, number, now, change }: SetQuestionProps) {
  const [state, submitWithoutScript] = useActionState(answerSetAction, IDLE)
  const [fault, setFault] = useState<string | null>(null)
  const { entry } = poured
  if (!entry || !isGranted(view.viewer.role, 'writeLog') || !isAsked(poured, now)) return null

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const button = (event.nativeEvent as SubmitEvent).submitter as HTMLButtonElement | null
    const fields = new FormData(event.currentTarget, button)
    // The time is only of the answer "it was set at".
    if (fields.get('outcome') !== 'set' || button?.dataset.now) fields.set('atTime', '')
    setFault(null)
    const found = { outcome: fields.get('outcome') as PouredPassView['outcome'], outcomeAt: new Date().toISOString() }
    setFault(await change(() => answerSetAction(IDLE, fields), withFound(view, number, found)))
  }

  return (
    <form action={submitWithoutScript} onSubmit={submit} noValidate className="mt-2 print:hidden">
      <input type="hidden" name="rinkId" value={view.rink.id} />
      <input type="hidden" name="entryId" value={entry.id} />
      <input type="hidden" name="version" value={entry.version} />
      <p className="font-medium">Is it set?</p>
      <div className="mt-1 flex flex-wrap gap-3">
        <Button type="submit" name="outcome" value="set" data-now="yes">
          Set
        </Button>
        <Button type="submit" name="outcome" value="wet">
          Still wet
        </Button>
        <Button type="submit" name="outcome" value="spoiled">
          Spoiled
        </Button>
      </div>
      <Disclosure summary="It was set earlier" className="text-note">
        <TextField label={`Pass ${number} was set at`} name="atTime" type="time" error={state.fields?.atTime} />
        <Button type="submit" name="outcome" value="set">
          Log this time
        </Button>
      </Disclosure>
      <p role="alert" className="mt-2 text-note text-rust empty:hidden">
        {fault ?? (state.status === 'error' ? state.message : '')}
      </p>
    </form>
  )
}

type Found = Pick<PouredPassView, 'outcome' | 'outcomeAt'>

function withFound(view: TonightView, number: number, found: Found): TonightView {
  if (!view.outlook) return view
  const passes = view.outlook.passes.map((pass) =>
    pass.number === number && pass.poured ? { ...pass, poured: { ...pass.poured, ...found } } : pass,
  )
  return { ...view, outlook: { ...view.outlook, passes } }
}
