// Every setting, parsed once. A missing or malformed one stops the start with one line that names it.
import { z } from 'zod'

const base64Url = (what: string) => z.string().regex(/^[A-Za-z0-9_-]{40,}$/, `must be a ${what} in base64url`)

const environmentSchema = z.object({
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, 'must be a postgres:// address'),
  PUBLIC_URL: z
    .url({ protocol: /^https?$/, message: 'must be the address that people type' })
    // Elsewhere browsers give no service worker, no push and no random keys on plain http.
    .regex(/^https:|^http:\/\/(localhost|127\.0\.0\.1|\[::1\])([:/]|$)/, 'must be https, or http on localhost')
    .transform((url) => url.replace(/\/$/, '')),
  NEXTAUTH_SECRET: z.string().min(32, 'must be at least 32 random characters'),
  WEATHER_PROVIDER: z.enum(['open-meteo'], 'must be open-meteo').default('open-meteo'),
  OPEN_METEO_URL: z.url('must be an http(s) address').default('https://api.open-meteo.com'),
  OPEN_METEO_API_KEY: z.string().optional(),
  /** Asks for the other runs too, which weighs ten times a forecast against the quota. */
  OPEN_METEO_ENSEMBLE_URL: z.url('must be an http(s) address').optional(),
  SMTP_URL: z.string().regex(/^smtps?:\/\//, 'must be an smtp:// or smtps:// address'),
  MAIL_FROM: z.string().min(3).default('Nightsheet <nightsheet@localhost>'),
  VAPID_PUBLIC_KEY: base64Url('VAPID public key'),
  VAPID_PRIVATE_KEY: base64Url('VAPID private key'),
  VAPID_SUBJECT: z
    .string()
    .regex(/^(mailto:|https:)/, 'must be a mailto: or https: address')
    .default('mailto:nightsheet@localhost'),
  /** Push services besides the browsers' own, comma-separated origins: the local fake, a self-hosted one. */
  PUSH_ORIGINS: z
    .string()
    .default('')
    .transform((list) => list.split(',').filter(Boolean)),
  /** PEM file of a certificate authority that PUSH_ORIGINS use. */
  PUSH_CA_FILE: z.string().optional(),
  /** Takes the address of the visitor from X-Forwarded-For: only behind a proxy that sets it. */
  TRUST_PROXY: z
    .enum(['0', '1'])
    .default('0')
    .transform((value) => value === '1'),
})

export type Environment = z.infer<typeof environmentSchema>

/** @throws Error whose message is one line naming every setting that is missing or malformed. */
export function parseEnvironment(source: Record<string, string | undefined>): Environment {
  const present = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''))
  const result = environmentSchema.safeParse(present)
  if (result.success) return result.data
  const faults = result.error.issues.map((issue) => {
    const name = issue.path.join('.')
    return present[name] === undefined ? `${name} is missing` : `${name} ${issue.message}`
  })
  throw new Error(`Settings: ${faults.join('; ')}`)
}

let parsed: Environment | undefined

/** The settings of this process. */
export function readEnvironment(): Environment {
  parsed ??= parseEnvironment(process.env)
  return parsed
}
