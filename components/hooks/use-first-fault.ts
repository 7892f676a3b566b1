// The form whose first field with a fault takes the focus: on a phone it may lie far below what was said.
'use client'
import { useEffect, useRef } from 'react'
import type { FormState } from '@/lib/http/form-state'

/** Whatever a fault belongs to: a field, or a group of choices. */
const FAULTY =
  'input[aria-invalid=true], select[aria-invalid=true], textarea[aria-invalid=true], fieldset[aria-invalid=true] input'

export function useFirstFault(state: FormState, isSending: boolean) {
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (state.status !== 'error' || isSending) return
    const field = form.current?.querySelector<HTMLElement>(FAULTY)
    field?.closest('details')?.setAttribute('open', '')
    field?.focus()
  }, [state, isSending])
  return form
}
