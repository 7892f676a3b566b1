'use client'
// The time of day and the ways of telling.
import { ActionForm } from '@/components/ui/action-form'
import { TickField } from '@/components/ui/choice-field'
import { TextField } from '@/components/ui/field'
import { choosePreferencesAction } from '../actions'

interface Props {
  rinkId: string
  email: string
  timeZone: string
  tellAt: string
  wantsEmail: boolean
  wantsPush: boolean
}

export function PreferencesForm({ rinkId, email, timeZone, tellAt, wantsEmail, wantsPush }: Props) {
  return (
    <ActionForm action={choosePreferencesAction} submit="Save" look="plain">
      {({ fields, values }) => (
        <>
          <input type="hidden" name="rinkId" value={rinkId} />
          <TextField
            label="Tell me at"
            name="tellAt"
            type="time"
            hint={`By the clock at the rink (${timeZone}). What cannot wait comes when it happens.`}
            defaultValue={values?.tellAt ?? tellAt}
            error={fields?.tellAt}
          />
          <fieldset className="mb-5">
            <legend className="font-medium">How?</legend>
            <TickField
              label="E-mail"
              note={`To ${email}`}
              name="wantsEmail"
              defaultChecked={values ? values.wantsEmail === 'on' : wantsEmail}
            />
            <TickField
              label="Notifications"
              note="On every device in the list below"
              name="wantsPush"
              defaultChecked={values ? values.wantsPush === 'on' : wantsPush}
            />
          </fieldset>
        </>
      )}
    </ActionForm>
  )
}
