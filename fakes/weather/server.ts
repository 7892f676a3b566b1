// A weather service on loopback that speaks Open-Meteo's wire format, with weather we choose.
import { createServer, type IncomingMessage, type ServerResponse } from 'node:http'
import { listen, stop } from '../http'
import { PAGE_HEADERS } from '../page'
import { answerControl } from './control'
import { answerWithFault, send, sendReason } from './faults'
import { writeBody } from './forecast-body'
import { writePage } from './page'
import { BadRequest, readQuery, weightOf } from './query'
import { FakeState, type LoggedRequest } from './state'

export interface WeatherFake {
  /** Base address for the forecast and the ensemble alike. */
  url: string
  close(): Promise<void>
}

/** Listens on loopback; port 0 takes a free one. */
export async function startWeatherFake({ port }: { port: number }): Promise<WeatherFake> {
  const state = new FakeState()
  const server = createServer((request, response) => {
    answer(state, request, response).catch((error: unknown) => {
      process.stderr.write(`weather fake: ${error instanceof Error ? error.stack : String(error)}\n`)
      if (response.headersSent) response.destroy()
      else sendReason(response, 500, 'Internal server error')
    })
  })
  return { url: `http://127.0.0.1:${await listen(server, port)}`, close: () => stop(server) }
}

async function answer(state: FakeState, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const url = new URL(request.url ?? '/', 'http://fake')
  if (url.pathname === '/') {
    response.writeHead(200, PAGE_HEADERS).end(writePage(state))
    return
  }
  if (url.pathname.startsWith('/__fake/')) return answerControl(state, url.pathname, request, response)
  if (request.method !== 'GET') return sendReason(response, 404, 'Not Found')
  if (url.pathname === '/v1/forecast') return answerForecast(state, 'forecast', url, request, response)
  if (url.pathname === '/v1/ensemble') return answerForecast(state, 'ensemble', url, request, response)
  sendReason(response, 404, 'Not Found')
}

async function answerForecast(
  state: FakeState,
  kind: 'forecast' | 'ensemble',
  url: URL,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const now = state.now()
  const fault = state.takeFault()
  const entry = logEntry(url, request, now, fault?.kind ?? null)
  state.log(entry)
  response.once('finish', () => (entry.status = response.statusCode))
  try {
    const query = readQuery(url.searchParams, kind, Math.floor(now.getTime() / 3_600_000))
    entry.weight = weightOf(query)
    const body = writeBody(query, now, (latitude, longitude) => state.scenarioAt(latitude, longitude))
    if (fault) return await answerWithFault(fault, request, response, body)
    send(response, { status: 200, body })
  } catch (error) {
    if (!(error instanceof BadRequest)) throw error
    sendReason(response, 400, error.message)
  }
}

function logEntry(url: URL, request: IncomingMessage, now: Date, fault: string | null): LoggedRequest {
  const query = new URLSearchParams(url.searchParams)
  query.delete('apikey')
  return {
    at: now.toISOString(),
    path: url.pathname,
    query: decodeURIComponent(query.toString()),
    userAgent: request.headers['user-agent'] ?? '',
    withKey: request.headers['x-api-key'] !== undefined || url.searchParams.has('apikey'),
    weight: 1,
    fault,
    status: null,
  }
}
