// Sending a form: by script where one runs, by plain post where none does. What is typed stays, also without an answer.
'use client'
import { unstable_isUnrecognizedActionError, unstable_rethrow } from 'next/navigation'
import { useActionState, useState, useTransition, type FormEvent } from 'react'
import {
  IDLE,
  NO_ANSWER,
  RENEWED,
  textFields,
  withoutPasswords,
  type FormAction,
  type FormState,
} from '@/lib/http/form-state'

export function useSend(action: FormAction) {
  const [posted, post] = useActionState(action, IDLE)
  const [answer, setAnswer] = useState<FormState | null>(null)
  const [isSending, start] = useTransition()

  function send(fields: FormData, onSaved?: (saved: FormState) => void) {
    start(async () => {
      const result = await action(IDLE, fields).catch((error: unknown) => lost(error, fields))
      start(() => {
        setAnswer(result)
        if (result.status === 'ok') onSaved?.(result)
      })
    })
  }

  /** By hand, because React empties a form that it sends itself, and breaks the page when no answer comes. */
  function submit(event: FormEvent<HTMLFormElement>, onSaved?: (saved: FormState) => void) {
    event.preventDefault()
    const button = (event.nativeEvent as SubmitEvent).submitter
    send(new FormData(event.currentTarget, button), onSaved)
  }

  return { state: answer ?? posted, post, send, submit, isSending, forget: () => setAnswer(IDLE) }
}

/** A redirect is no fault: Next follows it. */
function lost(error: unknown, fields: FormData): FormState {
  unstable_rethrow(error)
  const why = unstable_isUnrecognizedActionError(error) ? RENEWED : NO_ANSWER
  return { ...why, values: withoutPasswords(textFields(fields)) }
}
