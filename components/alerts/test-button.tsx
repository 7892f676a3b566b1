'use client'
// "Send me a test": a real message, and what became of it as soon as that is known.
import { useState } from 'react'
import useSWR from 'swr'
import { Button } from '@/components/ui/button'
import { TESTS_PATH, testKey } from '@/lib/cache-keys/tests'
import { fetchJson } from '@/lib/http/fetch-json'
import type { Test } from '@/lib/services/test-messages'

const LOOK_EVERY_MILLIS = 1000

function fateText({ state, error }: Test, isPush: boolean): string {
  if (state === 'delivered') return isPush ? 'Sent: its push service took it.' : 'Sent: the mail server took it.'
  if (state === 'expired') return 'Dropped: it came too late.'
  if (state === 'dead') return `Refused${error ? ` (${error})` : ''}.`
  return error ? `Not yet: ${error}. It is tried again.` : 'On its way.'
}

/** @param deviceId Without one the test goes by mail. */
export function TestButton({ deviceId, to }: { deviceId?: string; to: string }) {
  const [messageId, setMessageId] = useState<string>()
  const [fault, setFault] = useState('')
  const { data } = useSWR<Test>(messageId ? testKey(messageId) : null, fetchJson, {
    refreshInterval: (latest) => (latest && latest.state !== 'promised' ? 0 : LOOK_EVERY_MILLIS),
  })
  const send = async () => {
    setFault('')
    setMessageId(undefined)
    const response = await fetch(TESTS_PATH, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify(deviceId ? { deviceId } : {}),
    }).catch(() => undefined)
    const answer = await response?.json().catch(() => undefined)
    if (response?.ok) setMessageId(answer.messageId)
    else setFault(answer?.error?.message ?? 'No network: nothing was sent.')
  }
  const text = fault || (messageId ? fateText(data ?? { state: 'promised', error: null }, deviceId !== undefined) : '')
  return (
    <div>
      <Button onClick={send}>
        <span>
          Send me a test<span className="sr-only"> to {to}</span>
        </span>
      </Button>
      <p role="status" className="mt-1 text-note text-graphite empty:hidden">
        {text}
      </p>
    </div>
  )
}
