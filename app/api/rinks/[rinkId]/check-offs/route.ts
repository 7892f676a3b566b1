// Passes checked off, as the page and the service worker send them: at once, or when there is a network again.
import { requestContext } from '@/lib/auth/request-context'
import { readJson } from '@/lib/http/read-json'
import { route } from '@/lib/http/route'
import { sentCheckOffSchema } from '@/lib/schemas/floods'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { checkOffPass } from '@/lib/services/floods'

export const POST = route(async (request: Request, { params }: RouteContext<'/api/rinks/[rinkId]/check-offs'>) => {
  const context = await requestContext()
  const rinkId = rinkIdSchema.parse((await params).rinkId)
  const checkOff = await readJson(request, sentCheckOffSchema)
  await checkOffPass(context, { ...checkOff, rinkId })
  return new Response(null, { status: 204 })
})
