// The SMTP side of the mail fake: takes everything, and refuses, stalls or hangs up when told to.
import type { Socket } from 'node:net'
import { SMTPServer } from 'smtp-server'
import type { SMTPServerDataStream, SMTPServerSession } from 'smtp-server'
import type { Faults } from '../faults'
import type { MailStore } from './store'

export const MAIL_FAULTS = ['550', '451', 'hang', 'drop'] as const
export type MailFault = (typeof MAIL_FAULTS)[number]

export interface SmtpSide {
  server: SMTPServer
  /** Forgets which greylisted addresses have been here before. */
  clear(): void
  cutConnections(): void
}

export function createSmtpSide(store: MailStore, faults: Faults<MailFault>): SmtpSide {
  const greylisted = new Set<string>()
  const sockets = new Map<number, Socket>()

  const server = new SMTPServer({
    name: 'mail.localhost',
    disabledCommands: ['STARTTLS'],
    authOptional: true,
    allowInsecureAuth: true,
    size: 5_000_000,
    logger: false,
    onAuth: (auth, _session, done) => done(null, { user: auth.username }),
    onRcptTo({ address }, session, done) {
      const recipient = address.toLowerCase()
      const fault = faults.take(recipient) ?? standingFault(recipient, greylisted)
      if (fault === 'hang') return
      if (fault === 'drop') return void sockets.get(session.remotePort)?.destroy()
      done(fault ? refusal(fault, address) : null)
    },
    onData(stream, session, done) {
      catchMail(store, stream, session).then(() => done(), done)
    },
  })
  server.on('error', () => {})
  server.server.on('connection', (socket: Socket) => {
    const port = socket.remotePort ?? 0
    sockets.set(port, socket)
    socket.on('close', () => sockets.delete(port))
  })
  return {
    server,
    clear: () => greylisted.clear(),
    cutConnections: () => sockets.forEach((socket) => socket.destroy()),
  }
}

/** bounce@ has no mailbox; greylist@ is put off once. */
function standingFault(recipient: string, greylisted: Set<string>): MailFault | undefined {
  if (recipient.startsWith('bounce@')) return '550'
  if (!recipient.startsWith('greylist@') || greylisted.has(recipient)) return undefined
  greylisted.add(recipient)
  return '451'
}

/** Servers repeat the address that they refuse: whoever logs the answer must mind that. */
function refusal(code: '550' | '451', address: string): Error {
  const text = code === '550' ? `5.1.1 <${address}> no such mailbox` : `4.7.1 <${address}> greylisted, come back later`
  return Object.assign(new Error(text), { responseCode: Number(code) })
}

async function catchMail(
  store: MailStore,
  stream: SMTPServerDataStream,
  { envelope }: SMTPServerSession,
): Promise<void> {
  const chunks: Buffer[] = []
  for await (const chunk of stream as AsyncIterable<Buffer>) chunks.push(chunk)
  const from = envelope.mailFrom ? envelope.mailFrom.address : ''
  await store.add(Buffer.concat(chunks), { from, to: envelope.rcptTo.map(({ address }) => address) })
}
