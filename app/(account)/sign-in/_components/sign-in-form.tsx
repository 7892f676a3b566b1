'use client'
// One address, two ways in: the password, or a link by mail. Whoever had this browser before left nothing behind.
import { useEffect } from 'react'
import { forgetKeptPages } from '@/app/(account)/_components/forget-kept-pages'
import { ActionForm } from '@/components/ui/action-form'
import { Button } from '@/components/ui/button'
import { EmailField, PasswordField } from '@/components/ui/person-fields'
import { signInAction } from '../actions'

export function SignInForm({ next }: { next?: string }) {
  useEffect(forgetKeptPages, [])
  const byLink = (
    <Button type="submit" name="by" value="link">
      Send me a link instead
    </Button>
  )
  return (
    <ActionForm action={signInAction} submit="Sign in" otherButtons={byLink}>
      {(state) => (
        <>
          {next ? <input type="hidden" name="next" value={next} /> : null}
          <EmailField {...state} />
          <PasswordField {...state} />
        </>
      )}
    </ActionForm>
  )
}
