// The small decisions at the edge: where to return to, who is asking, which cookie.
import { expect, test } from 'vitest'
import { localPath, withNext } from '@/lib/auth/next-path'
import { hashPassword, verifyPassword } from '@/lib/auth/passwords'
import { sessionCookie } from '@/lib/auth/session-cookie'
import { createSessionToken, hashSessionToken } from '@/lib/auth/session-tokens'
import { visitorAddress } from '@/lib/auth/visitor-address'

test.each(['/rinks', '/rinks/new?step=2', '/rinks/a%20b'])('%s stays here', (path) => {
  expect(localPath(path)).toBe(path)
})

test.each([
  'https://evil.example/rinks',
  '//evil.example',
  '/\\evil.example',
  '/\t/evil.example',
  '\\/evil.example',
  '/.//evil.example',
  '/rinks/..//evil.example/rinks',
  '/%2e//evil.example',
  'javascript:alert(1)',
  'rinks',
  '',
  undefined,
  ['/rinks', '/rinks'],
  `/${'x'.repeat(600)}`,
])('%o leads nowhere', (path) => {
  expect(localPath(path)).toBeUndefined()
})

test('a path that climbs is flattened', () => {
  expect(localPath('/rinks/../account')).toBe('/account')
})

test('a door carries the page behind it, whole, or nothing', () => {
  const next = '/invitation?key=a.b&c=d'
  const { pathname, searchParams } = new URL(withNext('/sign-up', next), 'https://nightsheet.test')
  expect([pathname, [...searchParams]]).toEqual(['/sign-up', [['next', next]]])
  expect(withNext('/sign-in', undefined)).toBe('/sign-in')
})

test('the visitor is what our own proxy saw, not what the visitor wrote', () => {
  expect(visitorAddress('198.51.100.7, 203.0.113.9', true)).toBe('203.0.113.9')
  expect(visitorAddress('203.0.113.9', false)).toBeUndefined()
  expect(visitorAddress(null, true)).toBeUndefined()
  expect(visitorAddress('unknown', true)).toBeUndefined()
})

test('IPv6 is counted by network, and a mapped IPv4 address as itself', () => {
  expect(visitorAddress('2001:db8:1:2:aaaa:bbbb:cccc:dddd', true)).toBe('2001:db8:1:2::/64')
  expect(visitorAddress('2001:db8:1:2::1', true)).toBe('2001:db8:1:2::/64')
  expect(visitorAddress('::1', true)).toBe('0:0:0:0::/64')
  expect(visitorAddress('::ffff:203.0.113.9', true)).toBe('203.0.113.9')
})

test('the cookie is bound to https and to our host where there is https', () => {
  expect(sessionCookie('https://rink.example')).toEqual({
    name: '__Host-nightsheet.session',
    options: { httpOnly: true, sameSite: 'lax', path: '/', secure: true },
  })
  expect(sessionCookie('http://localhost:3000')).toMatchObject({
    name: 'nightsheet.session',
    options: { secure: false },
  })
})

test('tokens carry 256 bits and are hashed with SHA-256', () => {
  expect(Buffer.from(createSessionToken(), 'base64url')).toHaveLength(32)
  // FIPS 180-2, appendix B.1: the digest of "abc".
  expect(hashSessionToken('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad')
})

test('a password matches its own hash only, and nothing matches none', async () => {
  const hash = await hashPassword('twelve litres')
  expect(await verifyPassword(hash, 'twelve litres')).toBe(true)
  expect(await verifyPassword(hash, 'eleven litres')).toBe(false)
  expect(await verifyPassword(null, 'twelve litres')).toBe(false)
  expect(await verifyPassword(undefined, 'nobody has this password')).toBe(false)
})
