// Every page a person can open, by a name for its picture. Pages of a rink are relative to it.

export const OPEN_PAGES = {
  front: '/',
  'how-it-works': '/how-it-works',
  measuring: '/help/measuring',
  cautions: '/help/cautions',
  'sign-in': '/sign-in',
  'sign-up': '/sign-up',
  reset: '/reset',
  'check-your-mail': '/check-your-mail',
}

export const MEMBER_PAGES = {
  rinks: '/rinks',
  'set-up': '/rinks/new',
  account: '/account',
  'account-devices': '/account/devices',
  'account-security': '/account/security',
  'account-data': '/account/data',
}

export const RINK_PAGES = {
  tonight: '',
  week: '/week',
  log: '/log',
  kept: '/log/kept',
  season: '/log/season',
  more: '/more',
  plan: '/plan',
  filling: '/filling',
  freezing: '/freezing',
  alerts: '/alerts',
  settings: '/settings',
  people: '/people',
  'settings-place': '/settings/place',
  'settings-yard': '/settings/yard',
  'settings-ice': '/settings/ice',
  'settings-water': '/settings/water',
  'settings-hours': '/settings/hours',
  'settings-limits': '/settings/limits',
  'settings-delete': '/settings/delete',
  leave: '/leave',
  'who-may': '/who-may',
}

/** Pages of a rink that another page leads to: where the link stands, and what its address holds. */
export const LINKED_PAGES = {
  'week-night': { on: '/week', href: 'night=' },
  entry: { on: '/log', href: '/log/', not: ['/log/kept', '/log/season'] },
  'water-source': { on: '/settings/water', href: '/settings/water/' },
}

/**
 * @param {import('@playwright/test').Page} page
 * @param {string} rink
 * @param {{ on: string, href: string, not?: string[] }} linked
 * @returns the address of the first such link of a rink.
 */
export async function findLinkedPage(page, rink, { on, href, not = [] }) {
  await page.goto(rink + on)
  const found = page.locator(`main a[href*="${href}"]`)
  // The page may still be on its way behind its outline.
  await found.first().waitFor()
  const links = await found.evaluateAll((all) => all.map((link) => link.href.split('#')[0]))
  return links.find((link) => !not.some((part) => link.includes(part)))
}
