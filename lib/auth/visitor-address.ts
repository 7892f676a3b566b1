// The network address that limits are counted by.
import { isIP, isIPv6 } from 'node:net'

/**
 * The last entry of X-Forwarded-For is what our own proxy saw; earlier ones are whatever the visitor wrote.
 * Without a proxy the whole header is the visitor's: Next fills in the socket's address only where there is
 * none, so nothing in the request is reliable and the answer is undefined (limits by visitor then become one
 * shared, wider limit, lib/services/rate-limits.ts).
 */
export function visitorAddress(forwardedFor: string | null, isBehindProxy: boolean): string | undefined {
  if (!isBehindProxy) return undefined
  const last = forwardedFor?.split(',').at(-1)?.trim() ?? ''
  if (isIP(last) === 0) return undefined
  return isIPv6(last) ? networkOf(last) : last
}

/** A home gets a /64 of IPv6 addresses and could use a new one for each try. */
function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)
  if (mapped?.[1]) return mapped[1]
  const [head = '', tail] = address.split('%')[0]?.split('::') ?? []
  const left = head.split(':').filter(Boolean)
  const right = tail?.split(':').filter(Boolean) ?? []
  const zeros: string[] = Array(Math.max(0, 8 - left.length - right.length)).fill('0')
  const groups = [...left, ...zeros, ...right].slice(0, 4).map((group) => parseInt(group, 16).toString(16))
  return `${groups.join(':')}::/64`
}
