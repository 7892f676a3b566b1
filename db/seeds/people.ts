// The people of the demo and of the tests. All invented; the domain is reserved and delivers nowhere.

export const DEMO_PASSWORD = 'hose-before-midnight'

export const DEMO_PEOPLE = [
  { who: 'keeper', name: 'Maren Holt', email: 'maren@nightsheet.example', isAdmin: false },
  { who: 'crew', name: 'Theo Brandt', email: 'theo@nightsheet.example', isAdmin: false },
  { who: 'skater', name: 'Iris Vale', email: 'iris@nightsheet.example', isAdmin: false },
  { who: 'stranger', name: 'Odd Lund', email: 'odd@nightsheet.example', isAdmin: false },
  { who: 'admin', name: 'Ada Server', email: 'ada@nightsheet.example', isAdmin: true },
] as const

export type DemoPerson = (typeof DEMO_PEOPLE)[number]['who']
