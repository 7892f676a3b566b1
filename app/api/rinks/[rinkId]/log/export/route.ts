// The log as a file, for every member of the rink.
import type { NextRequest } from 'next/server'
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { logExportSchema } from '@/lib/schemas/log-query'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { exportLog } from '@/lib/services/log-export'

export const GET = route(async (request: NextRequest, { params }: RouteContext<'/api/rinks/[rinkId]/log/export'>) => {
  const context = await requestContext()
  const rinkId = rinkIdSchema.parse((await params).rinkId)
  const query = logExportSchema.parse(Object.fromEntries(request.nextUrl.searchParams))
  const { name, contentType, body } = await exportLog(context, rinkId, query)
  return new Response(body, {
    headers: {
      'Content-Type': contentType,
      'Content-Disposition': `attachment; filename="${name}"`,
      'Cache-Control': 'private, no-store',
      'X-Content-Type-Options': 'nosniff',
    },
  })
})
