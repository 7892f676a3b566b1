// Tonight as JSON, for the page that keeps itself fresh.
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { getTonight } from '@/lib/services/tonight'
import { z } from 'zod'

export const GET = route(async (_request: Request, { params }: RouteContext<'/api/rinks/[rinkId]/outlook'>) => {
  const rinkId = z.uuid().parse((await params).rinkId)
  const view = await getTonight(await requestContext(), rinkId)
  return Response.json(view, { headers: { 'Cache-Control': 'private, no-store' } })
})
