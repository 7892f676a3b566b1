// Every page a person can open, by a name for its picture. Pages of a rink are relative to it.

export const OPEN_PAGES = {
  front: '/',
  'how-it-works': '/how-it-works',
  measuring: '/help/measuring',
  cautions: '/help/cautions',
  'sign-in': '/sign-in',
  'sign-up': '/sign-up',
  reset: '/reset',
}

export const MEMBER_PAGES = {
  rinks: '/rinks',
  'set-up': '/rinks/new',
  account: '/account',
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
}
