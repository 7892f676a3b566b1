// True once an element has come near the part of the page in view; it stays true.
'use client'
import { useEffect, useState, type RefObject } from 'react'

export function useNearViewport(element: RefObject<HTMLElement | null>): boolean {
  const [isNear, setIsNear] = useState(false)
  useEffect(() => {
    const target = element.current
    if (!target) return
    const observer = new IntersectionObserver(
      (entries) => {
        if (!entries.some((entry) => entry.isIntersecting)) return
        setIsNear(true)
        observer.disconnect()
      },
      { rootMargin: '200px' },
    )
    observer.observe(target)
    return () => observer.disconnect()
  }, [element])
  return isNear
}
