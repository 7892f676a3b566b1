// What the service answers on a bad day.
import type { IncomingMessage, ServerResponse } from 'node:http'
import { z } from 'zod'

interface Answer {
  status: number
  type?: string
  body: string
}

const JSON_TYPE = 'application/json; charset=utf-8'
const reason = (status: number, text: string): Answer => ({
  status,
  body: JSON.stringify({ error: true, reason: text }),
})

/** By the window whose count ran out. */
const TOO_MANY = {
  minutely: reason(429, 'Minutely API request limit exceeded. Please try again in one minute.'),
  hourly: reason(429, 'Hourly API request limit exceeded. Please try again in the next hour.'),
  daily: reason(429, 'Daily API request limit exceeded. Please try again tomorrow.'),
  concurrent: reason(429, 'Too many concurrent requests'),
}

const PROXY_PAGE =
  '<html>\n<head><title>502 Bad Gateway</title></head>\n<body><h1>502 Bad Gateway</h1></body>\n</html>\n'

const ANSWERS = {
  '400': reason(400, "Parameter 'hourly' could not be read"),
  'no-data': reason(400, 'No data is available for this location'),
  '401': reason(401, 'API key required. Please add &apikey= to the URL.'),
  '403': reason(403, 'This API endpoint requires the API Professional or Enterprise plan'),
  '404': reason(404, 'Not Found'),
  '500': reason(500, 'Internal server error'),
  '503': reason(503, 'The service is overloaded'),
  'html-502': { status: 502, type: 'text/html', body: PROXY_PAGE },
  'html-200': { status: 200, type: 'text/html', body: PROXY_PAGE },
} satisfies Record<string, Answer>

const KINDS = [
  ...(Object.keys(ANSWERS) as (keyof typeof ANSWERS)[]),
  '429',
  'broken-200',
  'cut-off',
  'too-big',
  'slow',
  'hang',
  'none',
] as const

export const faultSchema = z.object({
  kind: z.enum(KINDS),
  /** Of the 429. */
  window: z.enum(['minutely', 'hourly', 'daily', 'concurrent']).default('minutely'),
  /** Of the slow answer. */
  delayMs: z.coerce.number().int().min(0).max(120_000).default(5000),
  /** Requests it lasts for; without it, until it is cleared. */
  times: z.coerce.number().int().min(1).optional(),
})

export type Fault = z.infer<typeof faultSchema>

export const FAULT_KINDS: readonly string[] = KINDS

/** Answers badly. `goodBody` is what the answer would have been. */
export async function answerWithFault(
  fault: Fault,
  request: IncomingMessage,
  response: ServerResponse,
  goodBody: string,
): Promise<void> {
  switch (fault.kind) {
    case '429':
      return send(response, TOO_MANY[fault.window])
    case 'broken-200':
      return send(response, {
        status: 200,
        body: `${goodBody.slice(0, 400)}Unexpected error while streaming data: timeoutReached`,
      })
    case 'too-big':
      return send(response, { status: 200, body: `${goodBody}${' '.repeat(6 * 1024 * 1024)}` })
    case 'cut-off':
      response.writeHead(200, { 'content-type': JSON_TYPE, 'content-length': Buffer.byteLength(goodBody) })
      response.write(goodBody.slice(0, 400), () => request.socket.destroy())
      return
    case 'slow':
      await new Promise((resolve) => setTimeout(resolve, fault.delayMs))
      return send(response, { status: 200, body: goodBody })
    case 'hang':
      return
    case 'none':
      return send(response, { status: 200, body: goodBody })
    default:
      return send(response, ANSWERS[fault.kind])
  }
}

/** No cache headers: the service sends none. */
export function send(response: ServerResponse, { status, type = JSON_TYPE, body }: Answer): void {
  if (response.destroyed) return
  response.writeHead(status, { 'content-type': type }).end(body)
}

export function sendReason(response: ServerResponse, status: number, text: string): void {
  send(response, reason(status, text))
}
