'use client'
// Name, address, password.
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { EmailField, NewPasswordField } from '@/components/ui/person-fields'
import { signUpAction } from '../actions'

export function SignUpForm({ next }: { next?: string }) {
  return (
    <ActionForm action={signUpAction} submit="Sign up">
      {(state) => (
        <>
          {next ? <input type="hidden" name="next" value={next} /> : null}
          <TextField
            label="Name"
            name="name"
            hint="As your crew knows you."
            autoComplete="name"
            defaultValue={state.values?.name}
            error={state.fields?.name}
          />
          <EmailField {...state} />
          <NewPasswordField {...state} label="Password" note="A few words in a row are good." />
        </>
      )}
    </ActionForm>
  )
}
