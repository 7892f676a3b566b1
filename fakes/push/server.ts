// A real push service over TLS on loopback: it hands out subscriptions, takes pushes, decrypts and keeps them.
import { mkdirSync, writeFileSync } from 'node:fs'
import { createServer as createPageServer } from 'node:http'
import { createServer as createTlsServer } from 'node:https'
import { dirname } from 'node:path'
import { z } from 'zod'
import { createLoopbackCertificate } from '../certificate'
import { createFaults } from '../faults'
import { answer, answerJson, listen, listener, readJson, stop } from '../http'
import type { Exchange } from '../http'
import { PAGE_HEADERS } from '../page'
import { listPage } from './pages'
import { PUSH_FAULTS, receivePush } from './receive'
import type { PushService } from './receive'
import { createPushStore } from './store'

export interface PushFake {
  /** Of the push resources, https: what PUSH_ORIGINS must name. */
  origin: string
  /** Of the page and the API. */
  url: string
  close(): Promise<void>
}

export interface PushFakeSettings {
  port: number
  pagePort: number
  /** Where the authority's certificate is written; subscriptions are kept beside it. */
  caFile: string
}

export async function startPushFake({ port, pagePort, caFile }: PushFakeSettings): Promise<PushFake> {
  mkdirSync(dirname(caFile), { recursive: true })
  const { caPem, certPem, keyPem } = createLoopbackCertificate(new Date())
  const service: PushService = {
    store: createPushStore(`${caFile}.subscriptions.json`),
    faults: createFaults(PUSH_FAULTS),
    origin: '',
  }
  const receiver = createTlsServer(
    { cert: certPem, key: keyPem },
    listener((exchange) => receivePush(service, exchange)),
  )
  const pages = createPageServer(listener((exchange) => answerReader(service, exchange)))
  service.origin = `https://127.0.0.1:${await listen(receiver, port)}`
  const url = `http://127.0.0.1:${await listen(pages, pagePort)}`
  writeFileSync(caFile, caPem)
  return {
    origin: service.origin,
    url,
    async close() {
      await Promise.all([stop(receiver), stop(pages)])
    },
  }
}

const subscribeSchema = z.object({ applicationServerKey: z.string().optional() })

async function answerReader({ store, faults, origin }: PushService, { request, response, url, route }: Exchange) {
  if (route === 'GET /') return answer(response, 200, listPage(store.list()), PAGE_HEADERS)
  if (route === 'POST /subscriptions') {
    const { applicationServerKey } = subscribeSchema.parse(await readJson(request))
    const { id, keys } = store.subscribe(applicationServerKey)
    return answerJson(response, 201, { id, endpoint: `${origin}/push/${id}`, keys })
  }
  if (route === 'GET /api/messages')
    return answerJson(response, 200, store.list(url.searchParams.get('id') ?? undefined))
  if (route === 'DELETE /api/messages') {
    store.clear()
    return answer(response, 204)
  }
  if (route === 'POST /__fake/fault') {
    faults.add(await readJson(request))
    return answer(response, 204)
  }
  const subscription = store.find(/^DELETE \/subscriptions\/([\w-]+)$/.exec(route)?.[1] ?? '')
  if (!subscription) return answerJson(response, 404, { error: 'no such thing here' })
  store.cancel(subscription)
  answer(response, 204)
}
