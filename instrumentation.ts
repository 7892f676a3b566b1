// Runs once when a server starts, and whenever a request ends in an error that nobody expected.
import type { Instrumentation } from 'next'

export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs' || process.env.NEXT_PHASE === 'phase-production-build') return
  const { checkSettings } = await import('./lib/http/start-up')
  checkSettings()
}

export const onRequestError: Instrumentation.onRequestError = async (error, request, context) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { logRequestError } = await import('./lib/http/start-up')
  logRequestError(error, request, context)
}
