'use server'
// Changes what the advice for a rink depends on.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { changeRinkSchema } from '@/lib/schemas/rinks'
import { changeRinkSettings } from '@/lib/services/rinks'

export const changeRinkAction = formAction(changeRinkSchema, async (input) => {
  await changeRinkSettings(await requestContext(), input)
  refresh()
  return 'Saved. Tonight is being worked out anew.'
})
