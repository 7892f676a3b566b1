// The form round the rink's fields: sends them, says what came of it, and leads to the first fault.
'use client'
import type { ReactNode } from 'react'
import { useFirstFault } from '@/components/hooks/use-first-fault'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { RinkForm } from './use-rink-form'

interface Props {
  form: RinkForm
  submit: string
  busy: string
  children: ReactNode
}

export function RinkFormFrame({ form, submit, busy, children }: Props) {
  const { state, isSending } = form
  const element = useFirstFault(state, isSending)
  // Without script the page comes back at its top, far from the button.
  const hasFaults = Object.keys(state.fields ?? {}).length > 0
  return (
    <form ref={element} action={form.post} onSubmit={form.submit} noValidate>
      {hasFaults ? <Notice tone="caution">{state.message}</Notice> : null}
      {children}
      {state.message ? (
        <Notice tone={state.status === 'error' ? 'caution' : 'plain'} live>
          {state.message}
        </Notice>
      ) : null}
      <Button type="submit" look="main" disabled={isSending} className="mt-2 w-full lg:w-auto">
        {isSending ? busy : submit}
      </Button>
    </form>
  )
}
