'use client'
// The button behind a mailed link: only a press uses the link up, so mail scanners may open it as they like.
import { ActionForm } from '@/components/ui/action-form'
import type { FormAction } from '@/lib/http/form-state'

export function KeyForm({ action, linkKey, submit }: { action: FormAction; linkKey: string; submit: string }) {
  return (
    <ActionForm action={action} submit={submit}>
      {() => <input type="hidden" name="key" value={linkKey} />}
    </ActionForm>
  )
}
