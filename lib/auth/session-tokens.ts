// Session tokens: 256 random bits in the cookie, their SHA-256 in the database.
import { createHash, randomBytes } from 'node:crypto'

export function createSessionToken(): string {
  return randomBytes(32).toString('base64url')
}

export function hashSessionToken(token: string): string {
  return createHash('sha256').update(token).digest('hex')
}
