// Sending a form: by script while the page already shows the result, by plain post where no script runs.
'use client'
import { useActionState, useState, useTransition, type FormEvent } from 'react'
import type { FormAction } from '@/components/ui/action-form'
import { IDLE, type FormState } from '@/lib/http/form-state'

const NO_ANSWER: FormState = {
  status: 'error',
  message: 'There was no answer from the server, so nothing was written down. Try again when you have a connection.',
}

export function useSend(action: FormAction) {
  const [posted, post] = useActionState(action, IDLE)
  const [answer, setAnswer] = useState<FormState | null>(null)
  const [isSending, start] = useTransition()

  function submit(event: FormEvent<HTMLFormElement>, onSaved?: (saved: FormState) => void) {
    event.preventDefault()
    const button = (event.nativeEvent as SubmitEvent).submitter
    const fields = new FormData(event.currentTarget, button)
    start(async () => {
      const result = await action(IDLE, fields).catch(() => NO_ANSWER)
      start(() => {
        setAnswer(result)
        if (result.status === 'ok') onSaved?.(result)
      })
    })
  }

  return { state: answer ?? posted, post, submit, isSending, forget: () => setAnswer(IDLE) }
}
