// Zod issues as one sentence per field, for forms and for JSON alike.
import type { ZodError } from 'zod'
import type { AppErrorCode } from '@/lib/errors'

/** The first fault of every field, by its dotted name. */
export function faultsByField(error: ZodError): Record<string, string> {
  const faults: Record<string, string> = {}
  for (const issue of error.issues) faults[issue.path.join('.') || 'form'] ??= issue.message
  return faults
}

export const INVALID_INPUT_MESSAGE = 'Something here needs another look.'

export const STATUS: Record<AppErrorCode, number> = {
  invalid_input: 422,
  not_signed_in: 401,
  not_found: 404,
  forbidden: 403,
  conflict: 409,
  other_account: 409,
  rate_limited: 429,
}
