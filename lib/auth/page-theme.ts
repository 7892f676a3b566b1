// The theme of the page that is asked for, known before its first byte, so that nothing flashes.
import 'server-only'
import { headers } from 'next/headers'
import { unstable_rethrow } from 'next/navigation'
import { cache } from 'react'
import { readClock } from '@/lib/clock'
import { logFailure } from '@/lib/log'
import { getPageTheme, SYSTEM_THEME, type PageTheme } from '@/lib/services/themes'
import { PATH_HEADER } from './next-path'
import { sharedPool } from './pool'
import { maybeViewer } from './request-context'

const RINK_PATH = /^\/rinks\/([0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})(?:[/?]|$)/

export const readPageTheme = cache(async (): Promise<PageTheme> => {
  try {
    const viewer = await maybeViewer()
    if (!viewer) return SYSTEM_THEME
    const rinkId = RINK_PATH.exec((await headers()).get(PATH_HEADER) ?? '')?.[1] ?? null
    return await getPageTheme({ db: sharedPool(), now: readClock(), viewer }, rinkId)
  } catch (error) {
    unstable_rethrow(error)
    // The page itself will say what is broken, in the colours of the system.
    logFailure('theme.failed', error)
    return SYSTEM_THEME
  }
})
