// What became of one's test.
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { testIdSchema } from '@/lib/schemas/accounts'
import { getTest } from '@/lib/services/test-messages'

export const GET = route(async (_request: Request, { params }: { params: Promise<{ messageId: string }> }) => {
  const context = await requestContext()
  return Response.json(await getTest(context, testIdSchema.parse((await params).messageId)), {
    headers: { 'Cache-Control': 'no-store' },
  })
})
