// While a page is open: turns it dark at the rink's sunset and light again at sunrise.
'use client'
import { useEffect } from 'react'
import type { Theme } from '@/lib/schemas/themes'
import type { PageTheme } from '@/lib/services/themes'

const MOST_TIMEOUT_MILLIS = 2 ** 31 - 1

function show(theme: Theme) {
  if (theme) document.documentElement.dataset.theme = theme
  else delete document.documentElement.dataset.theme
}

export function LightChanges({ theme, changes }: PageTheme) {
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined
    const follow = () => {
      clearTimeout(timer)
      const now = Date.now()
      const last = changes.findLast(({ at }) => Date.parse(at) <= now)
      show(last?.theme ?? theme)
      const next = changes.find(({ at }) => Date.parse(at) > now)
      if (next) timer = setTimeout(follow, Math.min(Date.parse(next.at) - now, MOST_TIMEOUT_MILLIS))
    }
    follow()
    // A phone that slept through sunset has missed its timer.
    document.addEventListener('visibilitychange', follow)
    return () => {
      clearTimeout(timer)
      document.removeEventListener('visibilitychange', follow)
    }
  }, [theme, changes])
  return null
}
