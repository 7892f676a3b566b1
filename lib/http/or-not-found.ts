// Turns "there is no such thing for you" into the not-found page, and "not with your role" into the page that says so.
import { headers } from 'next/headers'
import { notFound, redirect } from 'next/navigation'
import type { Route } from 'next'
import { ZodError } from 'zod'
import { AppError } from '@/lib/errors'
import { PATH_HEADER } from '@/lib/auth/next-path'

const RINK_PATH = /^\/rinks\/[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}(?=\/)/

/** A page that may not be seen, and an id that cannot be one, look the same to strangers as a page that does not exist. */
export async function orNotFound<T>(work: Promise<T>): Promise<T> {
  try {
    return await work
  } catch (error) {
    if (error instanceof ZodError) notFound()
    if (error instanceof AppError && error.code === 'forbidden') await showWhoMay()
    if (error instanceof AppError && (error.code === 'not_found' || error.code === 'forbidden')) notFound()
    throw error
  }
}

/** Members know the rink already: they are told whose page it is. */
async function showWhoMay(): Promise<void> {
  const rinkPath = RINK_PATH.exec((await headers()).get(PATH_HEADER) ?? '')?.[0]
  if (rinkPath) redirect(`${rinkPath}/who-may` as Route)
}
