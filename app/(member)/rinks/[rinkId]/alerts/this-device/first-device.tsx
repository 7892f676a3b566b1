'use client'
// Asks for notifications and leads on to Tonight once they are on.
import { useRouter } from 'next/navigation'
import { DeviceSwitch } from '@/components/alerts/device-switch'

interface Props {
  rinkId: string
  vapidPublicKey: string
  fingerprints: readonly string[]
}

export function FirstDevice({ rinkId, ...device }: Props) {
  const router = useRouter()
  return (
    <DeviceSwitch {...device} offer="Tell me on this device" onSwitchedOn={() => router.push(`/rinks/${rinkId}`)} />
  )
}
