// The usual action of a page: a service does the work, the page is read anew, and a sentence says what was done.
import { refresh } from 'next/cache'
import type { z } from 'zod'
import { requestContext } from '@/lib/auth/request-context'
import type { ServiceContext } from '@/lib/context'
import { formAction } from './form-action'

/** @param said The good news, or how it is worded; left out where the page itself shows the change. */
export function serviceAction<S extends z.ZodType>(
  schema: S,
  service: (context: ServiceContext, input: z.output<S>) => Promise<unknown>,
  said?: string | ((input: z.output<S>) => string),
) {
  return formAction(schema, async (input) => {
    await service(await requestContext(), input)
    refresh()
    return typeof said === 'function' ? said(input) : said
  })
}
