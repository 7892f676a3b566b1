'use client'
// The button behind a mailed link: only a press uses the link up, so mail scanners may open it as they like.
import { ActionForm, type FormAction } from '@/components/ui/action-form'

export function KeyForm({ action, linkKey, submit }: { action: FormAction; linkKey: string; submit: string }) {
  return (
    <ActionForm action={action} submit={submit}>
      {() => <input type="hidden" name="key" value={linkKey} />}
    </ActionForm>
  )
}
