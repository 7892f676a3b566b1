// Places by the beginning of their name, or the description of a position: for the set-up form of signed-in people.
import type { NextRequest } from 'next/server'
import { requestContext } from '@/lib/auth/request-context'
import { route } from '@/lib/http/route'
import { placeQuerySchema } from '@/lib/schemas/coordinates'
import { describePosition, searchPlaces } from '@/lib/services/places'

export const GET = route(async (request: NextRequest) => {
  const context = await requestContext()
  const query = placeQuerySchema.parse(Object.fromEntries(request.nextUrl.searchParams))
  const places =
    'q' in query
      ? await searchPlaces(context, query.q)
      : [await describePosition(context, { latitudeDeg: query.latitude, longitudeDeg: query.longitude })]
  return Response.json({ places }, { headers: { 'Cache-Control': 'private, no-store' } })
})
