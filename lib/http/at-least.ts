// Answers that take equally long, whether or not there was somebody to write to.
import { setTimeout as wait } from 'node:timers/promises'

/** Well above the few milliseconds that promising a mail takes. */
export const MAIL_ANSWER_MILLIS = 400

/** The outcome of the work, but not before the time has passed; a failure waits as well. */
export async function atLeast<T>(millis: number, work: Promise<T>): Promise<T> {
  const [outcome] = await Promise.allSettled([work, wait(millis)])
  if (outcome.status === 'rejected') throw outcome.reason
  return outcome.value
}
