// The key of an entry being written: the same until it is saved, whatever the server renders meanwhile. Sent twice, it is kept once.
'use client'
import { useState } from 'react'
import type { FormState } from '@/lib/http/form-state'

export interface KeptKey {
  key: string
  /** What the form knew when last looked at. */
  seen: FormState
  /** Saved with it: the next entry takes another. */
  isSpent: boolean
}

/** @param offered New with each rendering of the page. */
export function keepKey(kept: KeptKey, state: FormState, offered: string): KeptKey {
  const isSpent = kept.isSpent || (state !== kept.seen && state.status === 'ok')
  if (isSpent && offered !== kept.key) return { key: offered, seen: state, isSpent: false }
  return state === kept.seen ? kept : { ...kept, seen: state, isSpent }
}

export function useEntryKey(state: FormState, offered: string): string {
  const [kept, setKept] = useState<KeptKey>({ key: offered, seen: state, isSpent: false })
  const now = keepKey(kept, state, offered)
  if (now !== kept) setKept(now)
  return now.key
}
