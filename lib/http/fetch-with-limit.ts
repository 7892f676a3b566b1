// Fetches from servers that are not ours, with a time limit and a cap on the body: none can hold a worker or fill its memory.

export type OutboundFault = 'time_limit' | 'body_cap' | 'network'

export class OutboundError extends Error {
  constructor(
    readonly fault: OutboundFault,
    message: string,
    options?: ErrorOptions,
  ) {
    super(message, options)
    this.name = 'OutboundError'
  }
}

export interface OutboundOptions {
  /** For the whole exchange, from connecting to the last byte. [ms] */
  timeLimitMs: number
  bodyCapBytes: number
  method?: 'GET' | 'POST'
  headers?: Record<string, string>
  body?: string | Uint8Array<ArrayBuffer>
  signal?: AbortSignal
}

export interface OutboundResponse {
  status: number
  headers: Headers
  body: string
}

/**
 * One exchange, whatever the status. Redirects are returned, not followed: a key or a signed body must not travel to
 * a server nobody named.
 *
 * @throws OutboundError when there is no whole answer; the caller's own reason when `signal` stopped it.
 */
export async function fetchWithLimit(url: string | URL, options: OutboundOptions): Promise<OutboundResponse> {
  const timeLimit = AbortSignal.timeout(options.timeLimitMs)
  const signal = options.signal ? AbortSignal.any([options.signal, timeLimit]) : timeLimit
  try {
    const response = await fetch(url, {
      method: options.method ?? 'GET',
      headers: options.headers,
      body: options.body,
      redirect: 'manual',
      cache: 'no-store',
      signal,
    })
    return { status: response.status, headers: response.headers, body: await readBody(response, options.bodyCapBytes) }
  } catch (error) {
    if (error instanceof OutboundError) throw error
    if (options.signal?.aborted) throw options.signal.reason
    if (timeLimit.aborted) {
      throw new OutboundError('time_limit', `No whole answer within ${options.timeLimitMs} ms`, { cause: error })
    }
    throw new OutboundError('network', `Connection failed (${networkCode(error)})`, { cause: error })
  }
}

async function readBody(response: Response, capBytes: number): Promise<string> {
  if (!response.body) return ''
  const reader = response.body.getReader()
  const chunks: Uint8Array[] = []
  let size = 0
  for (;;) {
    const { done, value } = await reader.read()
    if (done) return Buffer.concat(chunks).toString('utf8')
    size += value.byteLength
    if (size > capBytes) {
      await reader.cancel()
      throw new OutboundError('body_cap', `Answer is larger than ${capBytes} bytes`)
    }
    chunks.push(value)
  }
}

function networkCode(error: unknown): string {
  for (let e: unknown = error; e instanceof Error; e = e.cause) {
    if ('code' in e && typeof e.code === 'string') return e.code
  }
  return error instanceof Error ? error.message : 'unknown'
}
