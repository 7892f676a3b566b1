// Silence: for tonight, until a date, or not any more.
'use client'
import { useActionState, useState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import { IDLE } from '@/lib/http/form-state'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { dayText } from '@/components/rinks/reader'
import { muteAction } from '../actions'
import type { ChangeView } from './use-tonight'

export function Mute({ view, change }: { view: TonightView; change: ChangeView }) {
  const [state, submitWithoutScript] = useActionState(muteAction, IDLE)
  const [fault, setFault] = useState<{ isDate: boolean; message: string } | null>(null)
  const { mutedThrough } = view.viewer
  const tonight = view.night.date
  const isMuted = mutedThrough !== null && mutedThrough >= tonight

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const button = (event.nativeEvent as SubmitEvent).submitter as HTMLButtonElement | null
    const fields = new FormData(event.currentTarget, button)
    const until = String(fields.get('until'))
    const through = { tonight, date: String(fields.get('throughDate')), never: null }[until] ?? null
    setFault(null)
    const shown = { ...view, viewer: { ...view.viewer, mutedThrough: through } }
    const message = await change(() => muteAction(IDLE, fields), shown)
    setFault(message === null ? null : { isDate: until === 'date', message })
  }

  const dateFault = fault?.isDate ? fault.message : state.fields?.throughDate
  const otherFault = fault?.isDate === false ? fault.message : undefined
  return (
    <form action={submitWithoutScript} onSubmit={submit} noValidate className="mt-5 print:hidden">
      <input type="hidden" name="rinkId" value={view.rink.id} />
      {isMuted ? (
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
          <p>
            {mutedThrough === tonight
              ? 'Alerts are silent tonight.'
              : `Alerts are silent through the night of ${dayText(mutedThrough)}.`}
          </p>
          <Button type="submit" name="until" value="never">
            Unmute
          </Button>
        </div>
      ) : (
        <div className="flex flex-wrap items-start gap-x-4">
          <Button type="submit" name="until" value="tonight">
            Mute for tonight
          </Button>
          <Disclosure summary="Mute until a date">
            <TextField
              label="Last silent night"
              name="throughDate"
              type="date"
              min={tonight}
              defaultValue={tonight}
              error={dateFault}
            />
            <Button type="submit" name="until" value="date">
              Mute
            </Button>
          </Disclosure>
        </div>
      )}
      <p role="alert" className="mt-2 text-note text-rust empty:hidden">
        {otherFault}
      </p>
    </form>
  )
}
