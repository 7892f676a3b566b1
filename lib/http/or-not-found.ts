// Turns "there is no such thing for you" into the not-found page.
import { notFound } from 'next/navigation'
import { ZodError } from 'zod'
import { AppError } from '@/lib/errors'

/** A page that may not be seen, and an id that cannot be one, look the same as a page that does not exist. */
export async function orNotFound<T>(work: Promise<T>): Promise<T> {
  try {
    return await work
  } catch (error) {
    if (error instanceof ZodError) notFound()
    if (error instanceof AppError && (error.code === 'not_found' || error.code === 'forbidden')) notFound()
    throw error
  }
}
