// Tonight's view, kept fresh while you look: every minute and on return; every 2 s until the first forecast is read.
'use client'
import { useCallback, useState } from 'react'
import useSWR from 'swr'
import { useOnline } from '@/components/hooks/use-online'
import { outlookKey } from '@/lib/cache-keys/outlook'
import { fetchJson, FetchJsonError } from '@/lib/http/fetch-json'
import { NO_ANSWER, type FormState } from '@/lib/http/form-state'
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { OFF_SEASON } from './off-season'

const SOON = 2000

/** Why what is on screen may be old: no network, signed out, no longer on the rink's list, or a fault of ours. */
export type ReadTrouble = 'offline' | 'signed-out' | 'gone' | 'failed' | null

/** Does the work while `shown` is on screen; gives what went wrong as a sentence, or null. */
export type ChangeView = (work: () => Promise<FormState>, shown: TonightView) => Promise<string | null>

/** A new judgement is on its way, and until when it is worth asking often. */
type Awaited = { judgedAt: string | null; until: number } | null

class Refused extends Error {}

export function useTonight(initial: TonightView) {
  const key = outlookKey(initial.rink.id)
  const isOnline = useOnline()
  const [isFresh, setIsFresh] = useState(true)
  const [awaited, setAwaited] = useState<Awaited>(null)
  // What the server has just sent need not be asked for again; a sheet kept by the service worker is older.
  const [isKept] = useState(() => Date.now() - Date.parse(initial.readAt) > MINUTE_MILLIS)
  // Kept between renders: a new function would start the wait anew, and the minute would never be over.
  const refreshInterval = useCallback(
    (latest?: TonightView) => pauseBefore(latest ?? initial, awaited),
    [initial, awaited],
  )
  const { data, error, mutate } = useSWR<TonightView, Error>(key, fetchJson<TonightView>, {
    fallbackData: initial,
    revalidateOnMount: isKept,
    refreshInterval,
    dedupingInterval: 1000,
    onErrorRetry: (_error, _key, _config, retry, { retryCount }) =>
      setTimeout(() => retry({ retryCount }), MINUTE_MILLIS / 4),
    onError: () => setIsFresh(false),
    onSuccess: () => {
      setIsFresh(true)
      keepCopy(initial.rink.id, false)
    },
  })
  const view = data ?? initial
  const judgedAt = view.outlook?.judgedAt

  const change: ChangeView = async (work, shown) => {
    try {
      await mutate(doThenRead(work, key), { optimisticData: shown, rollbackOnError: true, revalidate: false })
      setAwaited({ judgedAt: judgedAt ?? null, until: Date.now() + MINUTE_MILLIS / 2 })
      keepCopy(initial.rink.id, true)
      return null
    } catch (fault) {
      return fault instanceof Refused ? fault.message : NO_ANSWER.message
    }
  }

  /** After something was sent by another way than `change`: a new judgement is on its way too. */
  const readAfterChange = useCallback(async () => {
    setAwaited({ judgedAt: judgedAt ?? null, until: Date.now() + MINUTE_MILLIS / 2 })
    await mutate()
    keepCopy(initial.rink.id, true)
  }, [mutate, judgedAt, initial.rink.id])

  const trouble = troubleOf(isOnline, isFresh ? undefined : error)
  return { view, trouble, change, readAgain: () => void mutate(), readAfterChange }
}

/** Has the service worker renew its copy of the sheet: at once after a change, else when it is some minutes old. */
function keepCopy(rinkId: string, isChanged: boolean): void {
  navigator.serviceWorker?.controller?.postMessage({ sheet: `/rinks/${rinkId}`, isChanged })
}

async function doThenRead(work: () => Promise<FormState>, key: string): Promise<TonightView> {
  const state = await work()
  if (state.status === 'error') throw new Refused(Object.values(state.fields ?? {})[0] ?? state.message)
  return fetchJson<TonightView>(key)
}

/** Short while the server still judges: the first forecast, or the plan after something was changed. */
function pauseBefore({ outlook, rink, lastReadFailed }: TonightView, awaited: Awaited): number {
  if (OFF_SEASON[rink.phase]) return MINUTE_MILLIS
  if (!outlook) return lastReadFailed ? MINUTE_MILLIS / 4 : SOON
  const isAwaited = awaited !== null && outlook.judgedAt === awaited.judgedAt && Date.now() < awaited.until
  return isAwaited ? SOON : MINUTE_MILLIS
}

function troubleOf(isOnline: boolean, error: Error | undefined): ReadTrouble {
  if (!isOnline) return 'offline'
  if (!error) return null
  if (error instanceof FetchJsonError) {
    if (error.status === 401) return 'signed-out'
    return error.status === 404 || error.status === 403 ? 'gone' : 'failed'
  }
  return 'offline'
}
