// E-mail by SMTP: one message per connection, and refusals split into those a later try may mend and those it cannot.
import { createTransport } from 'nodemailer'
import { DeliveryError } from './port'
import type { EmailMessage, EmailTransport } from './port'
import { redactReason } from './redact'

const CONNECT_MILLIS = 10_000
/** RFC 5321 section 4.5.3.2 grants a server minutes; the queue tries again sooner than that. */
const SILENCE_MILLIS = 20_000

export interface SmtpSettings {
  /** smtp:// or smtps://, with user and password where the server wants them. */
  url: string
  from: string
  /** How long a server may say nothing before the try counts as failed. */
  silenceMillis?: number
}

/** A transport that throws DeliveryError and nothing else. */
export function createSmtpTransport({ url, from, silenceMillis = SILENCE_MILLIS }: SmtpSettings): EmailTransport {
  const mailer = createTransport({
    url,
    connectionTimeout: Math.min(CONNECT_MILLIS, silenceMillis),
    greetingTimeout: silenceMillis,
    socketTimeout: silenceMillis,
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  return {
    async send(message) {
      if (!isOneAddress(message.to)) throw new DeliveryError('not one mail address', true)
      try {
        await mailer.sendMail({
          from,
          // As an object: text would be read as a list, and one address could become several.
          to: { name: '', address: message.to },
          subject: message.subject,
          text: message.text,
          html: message.html,
          messageId: message.messageId,
          headers: { 'Auto-Submitted': 'auto-generated', ...oneClickHeader(message) },
          list: message.unsubscribeUrl ? { unsubscribe: new URL(message.unsubscribeUrl).href } : undefined,
        })
      } catch (error) {
        throw toDeliveryError(error)
      }
    },
  }
}

/** RFC 8058 section 3.1: the post header makes the List-Unsubscribe link a one-click one. */
function oneClickHeader({ unsubscribeUrl }: EmailMessage): Record<string, string> {
  return unsubscribeUrl ? { 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' } : {}
}

function isOneAddress(text: string): boolean {
  return /^[^\s\p{Cc}<>(),;:"]+@[^\s\p{Cc}<>(),;:"@]+$/u.test(text)
}

function toDeliveryError(error: unknown): DeliveryError {
  const { code, command, response, message } = error as Error & { code?: string; command?: string; response?: string }
  // No cause: its text carries the address that the server refused.
  const reason = redactReason(response || message)
  const isRefusedRecipient = command === 'RCPT TO' && response !== undefined && isDeadMailbox(response)
  return new DeliveryError(
    `mail not accepted (${[code, command].filter(Boolean).join(', ')}): ${reason}`,
    isRefusedRecipient,
  )
}

/**
 * Only a refusal of the mailbox itself may disable an address. A refused password, sender or text is our fault
 * and is tried again. Codes: RFC 5321 section 4.2.3 and RFC 7504; enhanced ones: RFC 3463 sections 3.2 and 3.3,
 * of which 5.1.7 and 5.1.8 speak of the sender and 5.2.2 of a full mailbox.
 */
function isDeadMailbox(response: string): boolean {
  const [, code = '', enhanced] = /^(\d{3})[ -](?:(\d\.\d{1,3}\.\d{1,3})\b)?/.exec(response) ?? []
  if (!code.startsWith('5')) return false
  if (enhanced) return /^5\.(1\.(?!7$|8$)\d+|2\.1)$/.test(enhanced)
  return ['521', '550', '551', '553', '556'].includes(code)
}
