'use client'
// One address, two ways in: the password, or a link by mail.
import { ActionForm } from '@/components/ui/action-form'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { signInAction } from '../actions'

export function SignInForm({ next }: { next?: string }) {
  const byLink = (
    <Button type="submit" name="by" value="link">
      Send me a link instead
    </Button>
  )
  return (
    <ActionForm action={signInAction} submit="Sign in" otherButtons={byLink}>
      {({ fields, values }) => (
        <>
          {next ? <input type="hidden" name="next" value={next} /> : null}
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
            autoComplete="current-password"
            error={fields?.password}
          />
        </>
      )}
    </ActionForm>
  )
}
