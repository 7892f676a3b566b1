// A real SMTP server on loopback that keeps what it is sent, with a page and an API to read it.
import { createServer } from 'node:http'
import { createFaults } from '../faults'
import { answer, answerJson, listen, listener, readJson, stop } from '../http'
import type { Exchange } from '../http'
import { PAGE_HEADERS } from '../page'
import { HTML_PART_HEADERS, htmlPart, listPage, mailPage } from './pages'
import { createSmtpSide, MAIL_FAULTS } from './smtp'
import { createMailStore } from './store'
import type { CaughtMail, MailStore } from './store'

export interface MailFake {
  smtpUrl: string
  /** Of the page and the API. */
  url: string
  close(): Promise<void>
}

export async function startMailFake({ smtpPort, pagePort }: { smtpPort: number; pagePort: number }): Promise<MailFake> {
  const store = createMailStore()
  const faults = createFaults(MAIL_FAULTS)
  const smtp = createSmtpSide(store, faults)
  const pages = createServer(
    listener(async (exchange) => {
      const { request, response, route } = exchange
      if (route === 'POST /__fake/fault') {
        faults.add(await readJson(request))
        return answer(response, 204)
      }
      if (route === 'DELETE /api/messages') {
        store.clear()
        smtp.clear()
        return answer(response, 204)
      }
      answerReader(store, exchange)
    }),
  )
  const takenSmtpPort = await listen(smtp.server.server, smtpPort)
  const takenPagePort = await listen(pages, pagePort)
  return {
    smtpUrl: `smtp://127.0.0.1:${takenSmtpPort}`,
    url: `http://127.0.0.1:${takenPagePort}`,
    async close() {
      await Promise.all([stop(pages), new Promise<void>((resolve) => closeSmtp(smtp, resolve))])
    },
  }
}

function closeSmtp(smtp: ReturnType<typeof createSmtpSide>, done: () => void): void {
  smtp.server.close(done)
  smtp.cutConnections()
}

function answerReader(store: MailStore, { response, url, route }: Exchange): void {
  if (route === 'GET /') return answer(response, 200, listPage(store.list()), PAGE_HEADERS)
  if (route === 'GET /api/messages')
    return answerJson(response, 200, store.list(url.searchParams.get('to') ?? undefined))
  const [, area, id = '', part = ''] = /^GET \/(api\/messages|messages)\/(\d+)(|\.eml|\/html)$/.exec(route) ?? []
  const mail = store.find(id)
  if (!mail) return answerJson(response, 404, { error: 'no such message' })
  if (area === 'api/messages') return answerJson(response, 200, mail)
  answerMail(mail, part, response)
}

function answerMail(mail: CaughtMail, part: string, response: Exchange['response']): void {
  if (part === '.eml') answer(response, 200, mail.raw, { 'Content-Type': 'message/rfc822' })
  else if (part === '/html') answer(response, 200, htmlPart(mail), HTML_PART_HEADERS)
  else answer(response, 200, mailPage(mail), PAGE_HEADERS)
}
