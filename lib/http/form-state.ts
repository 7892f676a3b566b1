// What a form knows after its action ran. Passed to useActionState; safe to import in client components.

export interface FormState {
  status: 'idle' | 'ok' | 'error'
  message?: string
  /** What is wrong, by field. */
  fields?: Record<string, string>
  /** What was typed, so that nothing is lost; never passwords. */
  values?: Record<string, string>
  /** Somebody else was faster: the fields that a form must send to overwrite them deliberately. */
  latest?: Record<string, string>
}

export const IDLE: FormState = { status: 'idle' }
