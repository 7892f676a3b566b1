'use client'
// Silence for tonight, through a date, or the end of it.
import { ActionForm } from '@/components/ui/action-form'
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import { dayText } from '@/components/rinks/reader'
import { muteAction } from '../actions'

interface Props {
  rinkId: string
  tonightDate: string
  mutedThroughDate: string | null
}

export function MuteForm({ rinkId, tonightDate, mutedThroughDate }: Props) {
  if (mutedThroughDate && mutedThroughDate >= tonightDate) {
    return (
      <>
        <p className="mb-3 max-w-line">Nothing is sent through the night of {dayText(mutedThroughDate)}.</p>
        <ActionForm action={muteAction} submit="Tell me again" look="plain">
          {() => <Hidden rinkId={rinkId} until="never" />}
        </ActionForm>
      </>
    )
  }
  return (
    <>
      <ActionForm action={muteAction} submit="Mute for tonight" look="plain">
        {() => <Hidden rinkId={rinkId} until="tonight" />}
      </ActionForm>
      <Disclosure summary="Mute until a date" className="mt-2">
        <ActionForm action={muteAction} submit="Mute" look="plain">
          {({ fields, values }) => (
            <>
              <Hidden rinkId={rinkId} until="date" />
              <TextField
                label="Last silent night"
                name="throughDate"
                type="date"
                min={tonightDate}
                defaultValue={values?.throughDate ?? ''}
                error={fields?.throughDate}
              />
            </>
          )}
        </ActionForm>
      </Disclosure>
    </>
  )
}

function Hidden({ rinkId, until }: { rinkId: string; until: string }) {
  return (
    <>
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="until" value={until} />
    </>
  )
}
