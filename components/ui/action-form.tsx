// A form whose server action answers with a FormState: says what happened, keeps what was typed, works without scripts.
'use client'
import { useEffect, type ReactNode } from 'react'
import { useFirstFault } from '@/components/hooks/use-first-fault'
import { useSend } from '@/components/hooks/use-send'
import type { FormAction, FormState } from '@/lib/http/form-state'
import { Button } from './button'
import { Notice } from './notice'

export function ActionForm({
  action,
  submit,
  submitLabel,
  look = 'main',
  otherButtons,
  children,
}: {
  action: FormAction
  /** What the button says. */
  submit: string
  /** The same said in full, where several buttons say alike. */
  submitLabel?: string
  look?: 'main' | 'plain'
  /** Further ways to submit, told apart by their name and value. */
  otherButtons?: ReactNode
  /** The fields, given what the form knows. */
  children?: (state: FormState) => ReactNode
}) {
  const { state, post, submit: send, isSending } = useSend(action)
  const form = useFirstFault(state, isSending)
  useEffect(() => {
    // What was saved is what the fields start from now.
    if (state.status === 'ok') form.current?.reset()
  }, [state, form])
  return (
    <form ref={form} action={post} onSubmit={send} noValidate>
      {state.message ? (
        <Notice tone={state.status === 'error' ? 'caution' : 'plain'} live>
          {state.message}
        </Notice>
      ) : null}
      {children?.(state)}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" look={look} disabled={isSending} aria-label={submitLabel}>
          {submit}
        </Button>
        {otherButtons}
      </div>
    </form>
  )
}
