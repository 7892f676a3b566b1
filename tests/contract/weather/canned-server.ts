// A server that answers what it is given, one answer after the other, the last one for ever.
import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'

export interface CannedAnswer {
  status: number
  type?: string
  body: string
}

export interface CannedServer {
  url: string
  requests: { url: string; headers: NodeJS.Dict<string | string[]> }[]
  close(): Promise<void>
}

export async function startCannedServer(...answers: [CannedAnswer, ...CannedAnswer[]]): Promise<CannedServer> {
  const requests: CannedServer['requests'] = []
  const server = createServer((request, response) => {
    const { status, type, body } = answers[Math.min(requests.length, answers.length - 1)] ?? answers[0]
    requests.push({ url: request.url ?? '', headers: request.headers })
    response.writeHead(status, { 'content-type': type ?? 'application/json; charset=utf-8' }).end(body)
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    requests,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve())
        server.closeAllConnections()
      }),
  }
}
