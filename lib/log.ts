// One JSON line per event. Ids and durations only: never addresses, tokens or forecast dumps.
import { readClock } from '@/lib/clock'

type Fields = Record<string, string | number | boolean | null | undefined>

/** Logs a dotted event in the past tense (`alert.delivered`) with its ids. */
export function logEvent(event: string, fields: Fields = {}): void {
  process.stdout.write(`${JSON.stringify({ at: readClock().toISOString(), event, ...fields })}\n`)
}

/** Logs a failure with its message and the messages of its causes; stacks stay in `stack`. */
export function logFailure(event: string, error: unknown, fields: Fields = {}): void {
  const messages: string[] = []
  for (let e: unknown = error; e instanceof Error && messages.length < 5; e = e.cause)
    messages.push(`${e.name}: ${e.message}`)
  const stack = error instanceof Error ? error.stack?.split('\n').slice(1, 6).join(' | ') : undefined
  process.stderr.write(
    `${JSON.stringify({ at: readClock().toISOString(), event, ...fields, error: messages.join(' <- ') || String(error), stack })}\n`,
  )
}
