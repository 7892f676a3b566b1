// E-mail by SMTP: one message per connection, and refusals split into those a later try may mend and those it cannot.
import { createTransport } from 'nodemailer'
import { DeliveryError } from './port'
import type { EmailMessage, EmailTransport } from './port'
import { redactReason } from './redact'
import { isDeadMailbox } from './smtp-replies'

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
