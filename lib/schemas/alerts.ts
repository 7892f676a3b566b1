// How a person wants to be told, silence, and the addresses of their devices.
import { z } from 'zod'
import { refuserIn, tickSchema } from './fields'
import { clockTimeSchema, dateSchema } from './local-time'
import { rinkIdSchema } from './rinks'

export const alertPreferencesSchema = z.object({
  rinkId: rinkIdSchema,
  tellAt: clockTimeSchema,
  wantsPush: tickSchema,
  wantsEmail: tickSchema,
})

/** "tonight" spares a person the question which date tonight has. */
export const muteSchema = z
  .object({
    rinkId: rinkIdSchema,
    until: z.enum(['tonight', 'date', 'never'], 'Choose how long to be silent.'),
    throughDate: z.string().optional(),
  })
  .transform(({ rinkId, until, throughDate }, context) => {
    if (until !== 'date') return { rinkId, until }
    const date = dateSchema.safeParse(throughDate)
    if (date.success) return { rinkId, until, throughDate: date.data }
    refuserIn(context)('throughDate', 'Choose the last silent night.')
    return z.NEVER
  })

export const deviceIdSchema = z.uuid('That is no device.')
export const removeDeviceSchema = z.object({ rinkId: rinkIdSchema, deviceId: deviceIdSchema })

const BASE64URL = /^[A-Za-z0-9_-]+={0,2}$/

const keyOfBytes = (bytes: number) =>
  z
    .string()
    .regex(BASE64URL)
    .refine((key) => Buffer.from(key, 'base64url').length === bytes, `A key of ${bytes} bytes is expected.`)

const endpointSchema = z
  .url({ protocol: /^https$/, error: 'An https address is expected.' })
  .max(1000, 'That address is too long.')

/** As PushSubscription.toJSON() gives it: a point on P-256, uncompressed, and 16 random bytes (RFC 8291). */
export const pushSubscriptionSchema = z.object({
  endpoint: endpointSchema,
  keys: z.object({
    p256dh: keyOfBytes(65).refine(
      (key) => Buffer.from(key, 'base64url')[0] === 4,
      'An uncompressed point is expected.',
    ),
    auth: keyOfBytes(16),
  }),
})

export const replacedSubscriptionSchema = z.object({
  /** Some browsers no longer know the old one when they give it up. */
  oldEndpoint: endpointSchema.nullish(),
  subscription: pushSubscriptionSchema,
})

export const endpointOnlySchema = z.object({ endpoint: endpointSchema })

/** From the address in a mail: `userId.rinkId.signature`. */
export const unsubscribeTokenSchema = z
  .string('This link is not complete.')
  .regex(/^[0-9a-f-]{36}\.[0-9a-f-]{36}\.[A-Za-z0-9_-]{43}$/, 'This link is not complete.')

export type AlertPreferencesInput = z.output<typeof alertPreferencesSchema>
export type MuteInput = z.output<typeof muteSchema>
export type PushSubscriptionInput = z.output<typeof pushSubscriptionSchema>
