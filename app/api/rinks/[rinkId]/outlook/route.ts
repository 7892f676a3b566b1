// Tonight as JSON, for the page that keeps itself fresh.
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { getTonight } from '@/lib/services/tonight'

export const GET = route(async (_request: Request, { params }: RouteContext<'/api/rinks/[rinkId]/outlook'>) => {
  const rinkId = rinkIdSchema.parse((await params).rinkId)
  const view = await getTonight(await requestContext(), rinkId)
  return Response.json(view, { headers: { 'Cache-Control': 'private, no-store' } })
})
