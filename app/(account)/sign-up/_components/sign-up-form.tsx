'use client'
// Name, address, password.
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { MIN_PASSWORD_LENGTH } from '@/lib/schemas/accounts'
import { signUpAction } from '../actions'

export function SignUpForm() {
  return (
    <ActionForm action={signUpAction} submit="Sign up">
      {({ fields, values }) => (
        <>
          <TextField
            label="Name"
            name="name"
            hint="As your crew knows you."
            autoComplete="name"
            defaultValue={values?.name}
            error={fields?.name}
          />
          <TextField
            label="E-mail"
            name="email"
            type="email"
            autoComplete="username"
            defaultValue={values?.email}
            error={fields?.email}
          />
          <TextField
            label="Password"
            name="password"
            type="password"
            hint={`At least ${MIN_PASSWORD_LENGTH} characters. A few words in a row are good.`}
            autoComplete="new-password"
            error={fields?.password}
          />
        </>
      )}
    </ActionForm>
  )
}
