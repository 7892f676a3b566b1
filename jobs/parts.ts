// What the handlers work with, put together once from the settings.
import type { Knex } from 'knex'
import { createPool } from '@/db/knex'
import { readClock } from '@/lib/clock'
import type { Environment } from '@/lib/env'
import type { EmailTransport, PushTransport } from '@/lib/messaging/port'
import { createSmtpTransport } from '@/lib/messaging/smtp'
import { createWebPushTransport } from '@/lib/messaging/web-push'
import { createProvider } from '@/lib/weather/providers'
import type { WeatherProvider } from '@/lib/weather/port'

export interface WorkerParts {
  db: Knex
  readClock: () => Date
  provider: WeatherProvider
  email: EmailTransport
  push: PushTransport
  settings: { publicUrl: string; secret: string }
}

export function createParts(env: Environment): WorkerParts {
  return {
    db: createPool(env.DATABASE_URL),
    readClock,
    provider: createProvider(env),
    email: createSmtpTransport({ url: env.SMTP_URL, from: env.MAIL_FROM }),
    push: createWebPushTransport({
      vapid: { subject: env.VAPID_SUBJECT, publicKey: env.VAPID_PUBLIC_KEY, privateKey: env.VAPID_PRIVATE_KEY },
      extraOrigins: env.PUSH_ORIGINS,
      caFile: env.PUSH_CA_FILE,
    }),
    settings: { publicUrl: env.PUBLIC_URL, secret: env.NEXTAUTH_SECRET },
  }
}
