// The policy is strict in production; development gets the two exceptions that it cannot do without.
import { createHash } from 'node:crypto'
import { expect, test } from 'vitest'
import { contentSecurityPolicy } from '@/lib/http/content-security-policy'

test('production runs only what carries the nonce, and no inline style but the one that hides', () => {
  const policy = contentSecurityPolicy({ nonce: 'abc', isDevelopment: false, isHttps: true })
  expect(policy).toContain("script-src 'self' 'nonce-abc' 'strict-dynamic';")
  const hidden = createHash('sha256').update('display:none').digest('base64')
  expect(policy).toContain(`style-src-attr 'unsafe-hashes' 'sha256-${hidden}';`)
  expect(policy).toContain('upgrade-insecure-requests')
  expect(policy).not.toMatch(/unsafe-(inline|eval)/)
})

test('http is not told to upgrade, and development may evaluate', () => {
  const policy = contentSecurityPolicy({ nonce: 'abc', isDevelopment: true, isHttps: false })
  expect(policy).not.toContain('upgrade-insecure-requests')
  expect(policy).toContain("'unsafe-eval'")
})
