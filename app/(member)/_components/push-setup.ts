// What a browser needs to have itself told: our public key, and which of the person's devices are told already.
import { readEnvironment } from '@/lib/env'
import type { Device } from '@/lib/services/push-subscriptions'

export function pushSetup(devices: readonly Device[]): { vapidPublicKey: string; fingerprints: string[] } {
  const enabled = devices.filter(({ disabledReason }) => disabledReason === null)
  return {
    vapidPublicKey: readEnvironment().VAPID_PUBLIC_KEY,
    fingerprints: enabled.map(({ fingerprint }) => fingerprint),
  }
}
