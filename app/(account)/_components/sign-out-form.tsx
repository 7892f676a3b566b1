'use client'
// Signs out, and lets the service worker forget the night sheets that it keeps for when there is no network.
import { ActionForm } from '@/components/ui/action-form'
import type { FormAction } from '@/lib/http/form-state'
import { forgetKeptPages } from './forget-kept-pages'

export function SignOutForm({
  action,
  submit,
  look = 'plain',
}: {
  action: FormAction
  submit: string
  look?: 'main' | 'plain'
}) {
  return (
    <div onSubmit={forgetKeptPages}>
      <ActionForm action={action} submit={submit} look={look} />
    </div>
  )
}
