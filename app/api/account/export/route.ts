// Everything of one's account, as a file.
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { exportAccount } from '@/lib/services/account-export'

export const GET = route(async (_request: Request) => {
  const context = await requestContext()
  const document = await exportAccount(context)
  return new Response(JSON.stringify(document, null, 2), {
    headers: {
      'Content-Type': 'application/json; charset=utf-8',
      'Content-Disposition': `attachment; filename="nightsheet-${context.now.toISOString().slice(0, 10)}.json"`,
      'Cache-Control': 'no-store',
    },
  })
})
