// A browser's push subscription: new, moved to another address, or given up. Called by pages and by the service worker.
import { requestContext } from '@/lib/auth/request-context'
import { readEnvironment } from '@/lib/env'
import { readJson } from '@/lib/http/read-json'
import { route } from '@/lib/http/route'
import { endpointOnlySchema, pushSubscriptionSchema, replacedSubscriptionSchema } from '@/lib/schemas/alerts'
import { addDevice, forgetDevice, replaceDevice } from '@/lib/services/push-subscriptions'

export const POST = route(async (request: Request) => {
  const context = await requestContext()
  const subscription = await readJson(request, pushSubscriptionSchema)
  return Response.json(await addDevice(context, subscription, readEnvironment().PUSH_ORIGINS), { status: 201 })
})

export const PUT = route(async (request: Request) => {
  const context = await requestContext()
  const replacement = await readJson(request, replacedSubscriptionSchema)
  return Response.json(await replaceDevice(context, replacement, readEnvironment().PUSH_ORIGINS))
})

export const DELETE = route(async (request: Request) => {
  const context = await requestContext()
  const { endpoint } = await readJson(request, endpointOnlySchema)
  await forgetDevice(context, endpoint)
  return new Response(null, { status: 204 })
})
