// Mail as it was caught, newest last, held in memory.
import { simpleParser } from 'mailparser'

const MOST_KEPT = 500

export interface CaughtMail {
  id: string
  receivedAt: string
  /** Of the SMTP envelope, lower case. */
  from: string
  to: string[]
  subject: string
  text: string
  html: string
  /** As they stood in the mail, unfolded, in order. */
  headers: { name: string; value: string }[]
  raw: string
}

export interface MailStore {
  add(raw: Buffer, envelope: { from: string; to: string[] }): Promise<CaughtMail>
  list(to?: string): CaughtMail[]
  find(id: string): CaughtMail | undefined
  clear(): void
}

export function createMailStore(): MailStore {
  let caught: CaughtMail[] = []
  let count = 0
  return {
    async add(raw, { from, to }) {
      const parsed = await simpleParser(raw)
      const mail = {
        id: String((count += 1)),
        receivedAt: new Date().toISOString(),
        from: from.toLowerCase(),
        to: to.map((address) => address.toLowerCase()),
        subject: parsed.subject ?? '',
        text: parsed.text ?? '',
        html: parsed.html || '',
        headers: parsed.headerLines.map(({ line }) => splitHeader(line)),
        raw: raw.toString('utf8'),
      }
      caught = [...caught, mail].slice(-MOST_KEPT)
      return mail
    },
    list: (to) => caught.filter((mail) => !to || mail.to.includes(to.toLowerCase())),
    find: (id) => caught.find((mail) => mail.id === id),
    clear() {
      caught = []
    },
  }
}

function splitHeader(line: string): { name: string; value: string } {
  const colon = line.indexOf(':')
  return {
    name: line.slice(0, colon),
    value: line
      .slice(colon + 1)
      .replace(/\r?\n[ \t]+/g, ' ')
      .trim(),
  }
}
