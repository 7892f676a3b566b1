// What a form knows after its action ran; safe to import in client components.

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

/** A server action of a form. */
export type FormAction = (state: FormState, formData: FormData) => Promise<FormState>

/** The text fields of a form. Next's own fields and files are left out. */
export function textFields(formData: FormData): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const [name, value] of formData) {
    if (typeof value === 'string' && !name.startsWith('$ACTION')) fields[name] = value
  }
  return fields
}

export function withoutPasswords(fields: Record<string, string>): Record<string, string> {
  return Object.fromEntries(Object.entries(fields).filter(([name]) => !/password/i.test(name)))
}

/** The request or its answer was lost on the way: nobody here knows which. */
export const NO_ANSWER = {
  status: 'error',
  message:
    'There was no answer from the server, so this may not have been saved. Try again when you have a connection.',
} satisfies FormState

export const RENEWED: FormState = {
  status: 'error',
  message: 'Nightsheet was renewed since you opened this page. Load the page again, then send this once more.',
}
