// Notifications on this device: on or off, or what stands in the way and what to do about it.
'use client'
import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'
import { Button } from '@/components/ui/button'
import { PushRefusedError, readPushState, switchPushOff, switchPushOn, type PushState } from './this-browser'

const OBSTACLES: Partial<Record<PushState, string>> = {
  unsupported:
    'This browser shows no notifications from web pages. E-mail works, or open Nightsheet in another browser.',
  'needs-install':
    'On an iPhone or iPad, put Nightsheet on the home screen first: tap Share, then “Add to Home Screen”. Open it from there and come back to this page.',
  denied:
    'Notifications from this site are blocked. Allow them in the browser’s settings for this site (often behind the sign left of the address), then load this page again.',
}

const WORKING = 'Waiting for the browser'

interface Props {
  vapidPublicKey: string
  /** Of the account's devices that are not disabled. */
  fingerprints: readonly string[]
  /** What the button says; set-up asks in other words than the alerts page. */
  offer?: string
  onSwitchedOn?: () => void
}

export function DeviceSwitch({ vapidPublicKey, fingerprints, offer = 'Tell me on this device', onSwitchedOn }: Props) {
  const router = useRouter()
  const [state, setState] = useState<PushState>()
  const [fault, setFault] = useState('')
  const [isBusy, setIsBusy] = useState(false)
  const known = fingerprints.join()

  useEffect(() => {
    let isCurrent = true
    readPushState(known.split(',')).then(
      (read) => isCurrent && setState(read),
      () => isCurrent && setState('unsupported'),
    )
    return () => {
      isCurrent = false
    }
  }, [known])

  async function change(work: () => Promise<void>, after?: () => void) {
    setIsBusy(true)
    setFault('')
    try {
      await work()
      router.refresh()
      after?.()
    } catch (error) {
      setFault(error instanceof PushRefusedError ? error.message : 'That did not work. Try again in a minute.')
      setState(await readPushState(known.split(',')).catch(() => 'unsupported' as const))
    }
    setIsBusy(false)
  }

  const obstacle = state && OBSTACLES[state]
  return (
    <div>
      <noscript>
        <p>Notifications need script. E-mail works without.</p>
      </noscript>
      {obstacle ? <p className="mb-3 max-w-line">{obstacle}</p> : null}
      {state === 'on' ? (
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
          <p>This device is told.</p>
          <Button disabled={isBusy} onClick={() => change(switchPushOff)}>
            Stop on this device
          </Button>
        </div>
      ) : null}
      {state === 'off' ? (
        <Button look="main" disabled={isBusy} onClick={() => change(() => switchPushOn(vapidPublicKey), onSwitchedOn)}>
          {isBusy ? WORKING : offer}
        </Button>
      ) : null}
      <p role="status" className="mt-2 text-note text-rust empty:hidden">
        {fault}
      </p>
    </div>
  )
}
