'use client'
// A form whose server action answers with a FormState: says what happened, keeps what was typed, works without scripts.
import { useActionState, useEffect, useRef, type ReactNode } from 'react'
import { IDLE, type FormState } from '@/lib/http/form-state'
import { Button } from './button'
import { Notice } from './notice'

export type FormAction = (state: FormState, formData: FormData) => Promise<FormState>

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
  const [state, run, isPending] = useActionState(action, IDLE)
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (state.status === 'error') form.current?.querySelector<HTMLElement>('[aria-invalid=true]')?.focus()
  }, [state])
  return (
    <form ref={form} action={run} noValidate>
      {state.message ? (
        <Notice tone={state.status === 'error' ? 'caution' : 'plain'} live>
          {state.message}
        </Notice>
      ) : null}
      {children?.(state)}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" look={look} disabled={isPending} aria-label={submitLabel}>
          {submit}
        </Button>
        {otherButtons}
      </div>
    </form>
  )
}
