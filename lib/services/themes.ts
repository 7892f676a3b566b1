// What a person's pages are drawn in now, and when that changes while a page is open.
import { findThemeFacts } from '@/db/queries/themes'
import type { ServiceContext } from '@/lib/context'
import { daylight } from '@/lib/daylight'
import type { Theme } from '@/lib/schemas/themes'

export interface PageTheme {
  theme: Theme
  /** Sunsets and sunrises to come; instants as ISO text. */
  changes: { at: string; theme: 'light' | 'dark' }[]
}

export const SYSTEM_THEME: PageTheme = { theme: undefined, changes: [] }

const themeOf = (isDark: boolean): 'light' | 'dark' => (isDark ? 'dark' : 'light')

/** @param rinkId The rink on screen, if there is one. Without any rink, "after sunset" leaves it to the system. */
export async function getPageTheme({ db, now, viewer }: ServiceContext, rinkId: string | null): Promise<PageTheme> {
  const facts = await findThemeFacts(db, viewer.userId, rinkId)
  if (!facts || facts.theme === 'system') return SYSTEM_THEME
  if (facts.theme !== 'dark-after-sunset') return { theme: facts.theme, changes: [] }
  const { latitudeDeg, longitudeDeg } = facts
  if (latitudeDeg === null || longitudeDeg === null) return SYSTEM_THEME
  const { isDark, changes } = daylight(now, { latitudeDeg, longitudeDeg })
  return {
    theme: themeOf(isDark),
    changes: changes.map((change) => ({ at: change.at.toISOString(), theme: themeOf(change.isDark) })),
  }
}
