// How a message leaves the house. One transport per channel implements the same three lines.

export interface EmailMessage {
  to: string
  subject: string
  text: string
  html: string
  /** Stable over retries, so that a repeat is invisible to the reader. */
  messageId: string
  /** One-click unsubscribe (RFC 8058): URL that takes a POST. Absent for mail about the account itself. */
  unsubscribeUrl?: string
}

export interface PushMessage {
  subscription: { endpoint: string; p256dh: string; auth: string }
  /** What the service worker shows. Kept under 3,900 bytes. */
  payload: { title: string; body: string; url: string; tag: string }
  /** Replaces an undelivered message with the same topic at the push service (RFC 8030, 32 URL-safe characters at most). */
  topic: string
  ttlSeconds: number
}

export interface EmailTransport {
  send(message: EmailMessage): Promise<void>
}

export interface PushTransport {
  send(message: PushMessage): Promise<void>
}

/** A delivery that failed. Permanent ones disable the address; the rest are tried again until the message expires. */
export class DeliveryError extends Error {
  constructor(
    message: string,
    readonly permanent: boolean,
    options: { cause?: unknown; retryAfterSeconds?: number } = {},
  ) {
    super(message, { cause: options.cause })
    this.name = 'DeliveryError'
    this.retryAfterSeconds = options.retryAfterSeconds ?? null
  }
  readonly retryAfterSeconds: number | null
}
