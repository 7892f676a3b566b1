// True once something has taken more than a second: only then is progress worth showing.
'use client'
import { useEffect, useState } from 'react'

const PATIENCE = 1000

export function useSlow(isBusy: boolean): boolean {
  const [isSlow, setIsSlow] = useState(false)
  useEffect(() => {
    if (!isBusy) return
    const timer = setTimeout(() => setIsSlow(true), PATIENCE)
    return () => {
      clearTimeout(timer)
      setIsSlow(false)
    }
  }, [isBusy])
  return isSlow
}
