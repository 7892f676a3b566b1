// The topic under which a push service keeps only the newest of several undelivered messages.
import { createHash } from 'node:crypto'

const LONGEST_TOPIC = 32

/** Any key (`flood:{rinkId}:{nightDate}`) as the at most 32 URL-safe characters of RFC 8030 section 5.4. */
export function pushTopic(key: string): string {
  return createHash('sha256').update(key).digest('base64url').slice(0, LONGEST_TOPIC)
}
