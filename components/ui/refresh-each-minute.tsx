// Reads the page again each minute while somebody looks at it, and when they come back to it. What is typed stays.
'use client'
import { useRouter } from 'next/navigation'
import { useEffect } from 'react'
import { MINUTE_MILLIS } from '@/lib/physics/constants'

export function RefreshEachMinute() {
  const router = useRouter()
  useEffect(() => {
    const read = () => {
      if (document.visibilityState === 'visible') router.refresh()
    }
    const timer = setInterval(read, MINUTE_MILLIS)
    document.addEventListener('visibilitychange', read)
    return () => {
      clearInterval(timer)
      document.removeEventListener('visibilitychange', read)
    }
  }, [router])
  return null
}
