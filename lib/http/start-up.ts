// What instrumentation.ts does, in a file of its own so that it is loaded where there is a whole Node.
import { readEnvironment } from '@/lib/env'
import { logFailure } from '@/lib/log'

/** Stops the server with one line when a setting is missing or malformed. */
export function checkSettings(): void {
  try {
    readEnvironment()
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
    process.exit(1)
  }
}

/** The digest is all that the person sees; here it finds the cause. Queries of addresses may hold keys and stay out. */
export function logRequestError(
  error: unknown,
  request: { path: string; method: string },
  context: { routePath: string; routeType: string },
): void {
  const digest = error instanceof Error && 'digest' in error ? String(error.digest) : undefined
  const path = request.path.split('?')[0]
  logFailure('request.failed', error, { digest, method: request.method, path, route: context.routePath })
}
