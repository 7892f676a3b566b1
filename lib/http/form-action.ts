// Every server action of a form runs inside formAction(): parse, one piece of work, and a state that the form can show.
import { unstable_rethrow } from 'next/navigation'
import { ZodError, type z } from 'zod'
import { AppError, ConflictError, InvalidInputError } from '@/lib/errors'
import { logFailure } from '@/lib/log'
import { faultsByField, INVALID_INPUT_MESSAGE } from './errors-by-field'
import { textFields, withoutPasswords, type FormAction, type FormState } from './form-state'

/** Runs with the parsed input; what it returns is shown as the good news. A redirect passes through. */
type Work<S extends z.ZodType> = (input: z.output<S>) => Promise<string | void>

const BROKEN_MESSAGE = 'Something broke on our side. Nothing that you typed is lost: try again in a minute.'

function faultState(error: unknown, values: Record<string, string>): FormState {
  if (error instanceof ZodError) {
    return { status: 'error', message: INVALID_INPUT_MESSAGE, fields: faultsByField(error), values }
  }
  if (error instanceof AppError) {
    const fields = error instanceof InvalidInputError ? error.fields : {}
    const latest = error instanceof ConflictError ? { latest: error.latest } : {}
    return { status: 'error', message: error.message, fields, values, ...latest }
  }
  logFailure('action.failed', error)
  return { status: 'error', message: BROKEN_MESSAGE, values }
}

/** Makes a server action for useActionState. What was typed stays on the page, whatever breaks. */
export function formAction<S extends z.ZodType>(schema: S, work: Work<S>): FormAction {
  return async (_state, formData) => {
    const fields = textFields(formData)
    const values = withoutPasswords(fields)
    try {
      const message = await work(schema.parse(fields))
      return { status: 'ok', message: message ?? undefined, values }
    } catch (error) {
      unstable_rethrow(error)
      return faultState(error, values)
    }
  }
}
