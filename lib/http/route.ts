// Every route handler runs inside route(): one origin check, one translation of errors into status and JSON.
import { unstable_rethrow } from 'next/navigation'
import { ZodError } from 'zod'
import { AppError, InvalidInputError, RateLimitedError } from '@/lib/errors'
import { logFailure } from '@/lib/log'
import { faultsByField, INVALID_INPUT_MESSAGE, STATUS } from './errors-by-field'
import { BodyTooLargeError } from './read-json'
import { isFromHere } from './same-origin'

type Handler<R extends Request, C> = (request: R, context: C) => Promise<Response>

interface Fault {
  code: string
  message: string
  fields?: Record<string, string>
}

function refuse(status: number, error: Fault, headers: Record<string, string> = {}): Response {
  return Response.json({ error }, { status, headers: { 'Cache-Control': 'no-store', ...headers } })
}

function translate(error: unknown, request: Request): Response {
  if (error instanceof BodyTooLargeError) return refuse(413, { code: 'too_large', message: error.message })
  if (error instanceof ZodError) {
    return refuse(422, { code: 'invalid_input', message: INVALID_INPUT_MESSAGE, fields: faultsByField(error) })
  }
  if (error instanceof AppError) {
    const fields =
      error instanceof InvalidInputError && Object.keys(error.fields).length > 0 ? { fields: error.fields } : {}
    const wait = error instanceof RateLimitedError ? { 'Retry-After': String(error.retryAfterSeconds) } : undefined
    return refuse(STATUS[error.code], { code: error.code, message: error.message, ...fields }, wait)
  }
  logFailure('route.failed', error, { method: request.method, path: new URL(request.url).pathname })
  return refuse(500, { code: 'internal', message: 'Something broke on our side. Try again in a minute.' })
}

/**
 * Wraps a route handler.
 *
 * @param options.acceptsAnyOrigin for calls that no browser session vouches for, such as a mail program's one-click unsubscribe.
 */
export function route<R extends Request, C>(
  handler: Handler<R, C>,
  options: { acceptsAnyOrigin?: boolean } = {},
): Handler<R, C> {
  return async (request, context) => {
    if (!options.acceptsAnyOrigin && !isFromHere(request)) {
      return refuse(403, { code: 'forbidden', message: 'This request came from another site.' })
    }
    try {
      return await handler(request, context)
    } catch (error) {
      unstable_rethrow(error)
      return translate(error, request)
    }
  }
}
