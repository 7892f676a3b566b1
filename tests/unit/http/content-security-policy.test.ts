// The policy is strict in production; development gets the two exceptions that it cannot do without.
import { expect, test } from 'vitest'
import { contentSecurityPolicy } from '@/lib/http/content-security-policy'

test('production runs only what carries the nonce, and no inline style', () => {
  const policy = contentSecurityPolicy({ nonce: 'abc', isDevelopment: false, isHttps: true })
  expect(policy).toContain("script-src 'self' 'nonce-abc' 'strict-dynamic';")
  expect(policy).toContain("style-src-attr 'none'")
  expect(policy).toContain('upgrade-insecure-requests')
  expect(policy).not.toContain('unsafe')
})

test('http is not told to upgrade, and development may evaluate', () => {
  const policy = contentSecurityPolicy({ nonce: 'abc', isDevelopment: true, isHttps: false })
  expect(policy).not.toContain('upgrade-insecure-requests')
  expect(policy).toContain("'unsafe-eval'")
})
