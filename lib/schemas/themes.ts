// How the screens look, as a person may choose it.

export const THEMES = ['system', 'light', 'dark', 'dark-after-sunset'] as const
export type ThemeChoice = (typeof THEMES)[number]

/** What the page is drawn in; undefined leaves it to the system. */
export type Theme = 'light' | 'dark' | undefined
