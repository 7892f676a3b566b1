// What the fakes share of HTTP: bodies in, answers out, start and stop.
import type { IncomingMessage, RequestListener, Server, ServerResponse } from 'node:http'
import type { AddressInfo, Server as NetServer } from 'node:net'
import { ZodError } from 'zod'

const LARGEST_BODY = 1_000_000

export interface Exchange {
  request: IncomingMessage
  response: ServerResponse
  url: URL
  /** `GET /messages/12`, for a plain look-up of the route. */
  route: string
}

/** Turns one async function into a listener: malformed input answers 400, an unexpected failure 500. */
export function listener(answer: (exchange: Exchange) => Promise<void> | void): RequestListener {
  return async (request, response) => {
    const url = new URL(request.url ?? '/', 'http://127.0.0.1')
    try {
      await answer({ request, response, url, route: `${request.method} ${url.pathname}` })
    } catch (error) {
      const isMalformed = error instanceof ZodError || error instanceof SyntaxError
      answerJson(response, isMalformed ? 400 : 500, { error: error instanceof Error ? error.message : String(error) })
    }
  }
}

export async function readBody(request: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = []
  let size = 0
  for await (const chunk of request as AsyncIterable<Buffer>) {
    size += chunk.length
    if (size <= LARGEST_BODY) chunks.push(chunk)
  }
  return Buffer.concat(chunks)
}

/** The body as JSON; an empty one is an empty object. */
export async function readJson(request: IncomingMessage): Promise<unknown> {
  const text = (await readBody(request)).toString('utf8')
  return JSON.parse(text || '{}')
}

export function answer(
  response: ServerResponse,
  status: number,
  body = '',
  headers: Record<string, string> = {},
): void {
  response.writeHead(status, { 'Content-Type': 'text/plain; charset=utf-8', ...headers }).end(body)
}

export function answerJson(response: ServerResponse, status: number, value: unknown): void {
  answer(response, status, JSON.stringify(value, null, 2), { 'Content-Type': 'application/json; charset=utf-8' })
}

/** Listens on loopback only; port 0 takes any free one. Resolves to the port taken. */
export function listen(server: NetServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => {
      server.off('error', reject)
      resolve((server.address() as AddressInfo).port)
    })
  })
}

/** Stops at once: exchanges that hang on purpose are cut. */
export function stop(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve())
    server.closeAllConnections()
  })
}
