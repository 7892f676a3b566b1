// Checks who sends: VAPID over the Authorization header (RFC 8292).
import { createPublicKey, verify } from 'node:crypto'
import { z } from 'zod'

const LONGEST_LIFE_SECONDS = 24 * 3600

const claimsSchema = z.object({
  aud: z.string(),
  exp: z.number(),
  sub: z.string().regex(/^(mailto:|https:)/, 'sub must be a mailto: or https: address'),
})
const headerSchema = z.object({ alg: z.literal('ES256') })

export interface Sender extends z.infer<typeof claimsSchema> {
  /** Public key of the application server, base64url. */
  k: string
}

/** Carries the status that RFC 8292 section 4.2 leaves to the service: 401 without credentials, 403 with bad ones. */
export class VapidError extends Error {
  constructor(
    readonly status: 401 | 403,
    message: string,
  ) {
    super(message)
  }
}

/** @throws VapidError */
export function verifyVapid(authorization: string | undefined, origin: string, now: Date): Sender {
  const [, scheme = '', parameters = ''] = /^(\S+) +(.*)$/.exec(authorization ?? '') ?? []
  if (scheme.toLowerCase() !== 'vapid') throw new VapidError(401, 'Authorization: vapid is required')
  const { t = '', k = '' } = Object.fromEntries(parameters.split(',').map(splitParameter))
  const [header = '', claims = '', signature = ''] = t.split('.')
  try {
    headerSchema.parse(decode(header))
    if (!isSignedBy(k, `${header}.${claims}`, signature)) throw new Error('the signature does not fit the key k')
    const sender = claimsSchema.parse(decode(claims))
    checkClaims(sender, origin, now)
    return { ...sender, k }
  } catch (error) {
    throw new VapidError(403, error instanceof Error ? error.message : String(error))
  }
}

function checkClaims({ aud, exp }: z.infer<typeof claimsSchema>, origin: string, now: Date): void {
  const secondsLeft = exp - now.getTime() / 1000
  if (aud !== origin) throw new Error(`aud must be ${origin}`)
  if (secondsLeft <= 0) throw new Error('the token has expired')
  if (secondsLeft > LONGEST_LIFE_SECONDS) throw new Error('exp lies more than 24 hours ahead')
}

function isSignedBy(publicKey: string, signed: string, signature: string): boolean {
  const point = Buffer.from(publicKey, 'base64url')
  if (point.length !== 65 || point[0] !== 4) throw new Error('k must be an uncompressed P-256 point')
  const x = point.subarray(1, 33).toString('base64url')
  const y = point.subarray(33).toString('base64url')
  const key = createPublicKey({ key: { kty: 'EC', crv: 'P-256', x, y }, format: 'jwk' })
  const bytes = Buffer.from(signature, 'base64url')
  return verify('sha256', Buffer.from(signed), { key, dsaEncoding: 'ieee-p1363' }, bytes)
}

function splitParameter(text: string): [string, string] {
  const [, name = '', value = ''] = /^\s*(\w+)\s*=\s*"?([\w.-]*)"?\s*$/.exec(text) ?? []
  return [name, value]
}

function decode(part: string): unknown {
  return JSON.parse(Buffer.from(part, 'base64url').toString('utf8'))
}
