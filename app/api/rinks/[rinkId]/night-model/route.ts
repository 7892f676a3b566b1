// Tonight's model as JSON, fetched when the keeper opens a pass to change it.
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { getMovableNight } from '@/lib/services/night-model'

export const GET = route(async (_request: Request, { params }: RouteContext<'/api/rinks/[rinkId]/night-model'>) => {
  const rinkId = rinkIdSchema.parse((await params).rinkId)
  const night = await getMovableNight(await requestContext(), rinkId)
  return Response.json(night, { headers: { 'Cache-Control': 'private, no-store' } })
})
