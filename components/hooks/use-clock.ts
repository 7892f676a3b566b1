// The present minute for the screen. The first render uses the server's reading, so that both sides draw the same.
'use client'
import { startTransition, useEffect, useState } from 'react'
import { MINUTE_MILLIS } from '@/lib/physics/constants'

const minuteOf = (millis: number) => Math.floor(millis / MINUTE_MILLIS)
const isLaterMinute = (before: number) => minuteOf(Date.now()) > minuteOf(before)

/** @param readAt When the server read its clock, ISO text. */
export function useClock(readAt: string): number {
  const [now, setNow] = useState(() => Date.parse(readAt))
  useEffect(() => {
    // Within the same minute nothing reads differently; drawing anew gives way to a touch.
    const tick = () => startTransition(() => setNow((before) => (isLaterMinute(before) ? Date.now() : before)))
    const first = setTimeout(tick, 0)
    const timer = setInterval(tick, MINUTE_MILLIS / 2)
    document.addEventListener('visibilitychange', tick)
    return () => {
      clearTimeout(first)
      clearInterval(timer)
      document.removeEventListener('visibilitychange', tick)
    }
  }, [])
  return now
}
