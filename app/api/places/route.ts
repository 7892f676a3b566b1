// Places by the beginning of their name, or the description of a position: for the set-up form of signed-in people.
import type { NextRequest } from 'next/server'
import { requestContext } from '@/lib/auth/request-context'
import type { ServiceContext } from '@/lib/context'
import { route } from '@/lib/http/route'
import { placeNameQuerySchema, positionQuerySchema } from '@/lib/schemas/coordinates'
import { describePosition, searchPlaces, type PlaceSuggestion } from '@/lib/services/places'

export const GET = route(async (request: NextRequest) => {
  const context = await requestContext()
  const places = await find(context, Object.fromEntries(request.nextUrl.searchParams))
  return Response.json({ places }, { headers: { 'Cache-Control': 'private, no-store' } })
})

async function find(context: ServiceContext, query: Record<string, string>): Promise<PlaceSuggestion[]> {
  if (!('latitude' in query)) return searchPlaces(context, placeNameQuerySchema.parse(query).q)
  const { latitude, longitude } = positionQuerySchema.parse(query)
  return [await describePosition(context, { latitudeDeg: latitude, longitudeDeg: longitude })]
}
