// Check-offs that the server may not have yet: shown at once, sent when there is a network, each once, taken back when refused.
'use client'
import { useCallback, useEffect, useRef, useState } from 'react'
// Loaded with the page: a phone that has lost its network cannot fetch it any more.
import { drop, keep, listKept, send, type KeptCheckOff } from '@/components/rinks/kept-check-offs'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'

export interface CheckOffs {
  /** The view with what this device has checked off. */
  shown: TonightView
  checkOff: (pass: TonightPass) => Promise<string | null>
  /** True when the check-off was on this device only; else the server has to be asked to take it back too. */
  takeBack: (passNumber: number) => Promise<boolean>
  /** A try to send it has failed; it waits for a network. */
  isStuck: (passNumber: number) => boolean
  /** What was kept here and then refused, with the reason. */
  refused: KeptCheckOff[]
  dismiss: (entryKey: string) => void
}

export function useCheckOffs(view: TonightView, readAgain: () => Promise<unknown>): CheckOffs {
  const { id: rinkId } = view.rink
  const { id: userId } = view.viewer
  const [waiting, setWaiting] = useState<KeptCheckOff[]>([])
  const [refused, setRefused] = useState<KeptCheckOff[]>([])
  const [stuck, setStuck] = useState<readonly string[]>([])
  const underWay = useRef<Promise<void> | null>(null)
  const isAskedAgain = useRef(false)
  /** Keys of those that were sent with a network: the server may have them although no answer came. */
  const sentOut = useRef(new Set<string>())

  const readKept = useCallback(async () => {
    const kept = await listKept(userId, rinkId)
    setWaiting(unlessBothEmpty(kept.filter((one) => !one.refused)))
    setRefused(unlessBothEmpty(kept.filter((one) => one.refused)))
    return kept.filter((one) => !one.refused)
  }, [userId, rinkId])

  const sendOnce = useCallback(async () => {
    const left = await readKept()
    if (navigator.onLine) for (const { entryKey } of left) sentOut.current.add(entryKey)
    const outcomes = await Promise.all(left.map(async (one) => [one.entryKey, await send(one)] as const))
    setStuck(unlessBothEmpty(outcomes.flatMap(([key, outcome]) => (outcome === 'stuck' ? [key] : []))))
    // Read before it is taken off the list, so that it does not flicker.
    if (outcomes.some(([, outcome]) => outcome === 'sent')) await readAgain().catch(() => undefined)
    await readKept()
  }, [readKept, readAgain])

  const sendKept = useCallback(async () => {
    // What is kept while another send is under way goes right after it.
    isAskedAgain.current = underWay.current !== null
    if (underWay.current) return
    underWay.current = untilNotAsked(isAskedAgain, sendOnce).finally(() => {
      underWay.current = null
    })
    await underWay.current
  }, [sendOnce])

  useEffect(() => {
    const first = setTimeout(() => void sendKept(), 0)
    const onMessage = ({ data }: MessageEvent) => (data === 'check-offs-sent' ? void sendKept() : undefined)
    const onOnline = () => void sendKept()
    window.addEventListener('online', onOnline)
    navigator.serviceWorker?.addEventListener('message', onMessage)
    return () => {
      clearTimeout(first)
      window.removeEventListener('online', onOnline)
      navigator.serviceWorker?.removeEventListener('message', onMessage)
    }
  }, [sendKept])

  async function checkOff(pass: TonightPass): Promise<string | null> {
    const made: KeptCheckOff = {
      entryKey: crypto.randomUUID(),
      userId,
      rinkId,
      nightDate: view.night.date,
      passNumber: pass.number,
      layerMm: pass.layerMm,
      waterTemperatureC: pass.temperatureC,
      pouredAt: new Date().toISOString(),
    }
    setWaiting((before) => [...before, made])
    await keep(made)
    await sendKept()
    return null
  }

  async function takeBack(passNumber: number): Promise<boolean> {
    const one = waiting.find((kept) => kept.passNumber === passNumber && kept.nightDate === view.night.date)
    if (!one) return false
    setWaiting((before) => before.filter(({ entryKey }) => entryKey !== one.entryKey))
    await drop(one.entryKey)
    await underWay.current
    return !sentOut.current.has(one.entryKey)
  }

  function dismiss(entryKey: string): void {
    setRefused((before) => before.filter((one) => one.entryKey !== entryKey))
    void drop(entryKey)
  }

  const ofTonight = waiting.filter(({ nightDate }) => nightDate === view.night.date)
  return {
    shown: withWaiting(view, ofTonight),
    checkOff,
    takeBack,
    isStuck: (passNumber) => ofTonight.some((one) => one.passNumber === passNumber && stuck.includes(one.entryKey)),
    refused,
    dismiss,
  }
}

async function untilNotAsked(isAskedAgain: { current: boolean }, work: () => Promise<void>): Promise<void> {
  do {
    isAskedAgain.current = false
    await work()
  } while (isAskedAgain.current)
}

/** Nothing kept before and nothing now, as on almost every visit: the page need not be drawn anew. */
function unlessBothEmpty<T>(now: T[]): (before: readonly T[]) => T[] {
  return (before) => (before.length + now.length === 0 ? (before as T[]) : now)
}

function withWaiting(view: TonightView, waiting: readonly KeptCheckOff[]): TonightView {
  if (!view.outlook || waiting.length === 0) return view
  const passes = view.outlook.passes.map((pass): TonightPass => {
    const kept = waiting.find(({ passNumber }) => passNumber === pass.number)
    if (!kept || pass.poured) return pass
    const unknown = { by: null, entry: null, saidSetByAt: null, outcome: null, outcomeAt: null }
    return { ...pass, poured: { at: kept.pouredAt, ...unknown } }
  })
  return { ...view, outlook: { ...view.outlook, passes } }
}
