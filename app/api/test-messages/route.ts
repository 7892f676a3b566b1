// Sends a test to one's own device or mailbox.
import { requestContext } from '@/lib/auth/request-context'
import { readJson } from '@/lib/http/read-json'
import { route } from '@/lib/http/route'
import { testSchema } from '@/lib/schemas/accounts'
import { sendTest } from '@/lib/services/test-messages'

export const POST = route(async (request: Request) => {
  const context = await requestContext()
  return Response.json(await sendTest(context, await readJson(request, testSchema)), { status: 201 })
})
