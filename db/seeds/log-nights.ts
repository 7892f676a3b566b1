// What the demo's people did in the three weeks before today, to the invented weather of past-weather.ts.
import type { DemoPerson } from './people'

export interface DemoEntry {
  /** Of the night in the list of past nights. */
  night: number
  /** On the rink's clock; from noon on it is the night's own date. */
  at: string
  by: Extract<DemoPerson, 'keeper' | 'crew'>
  /** As typed into the form. A reading is typed from what the model has: people drill close to it. */
  fields: Record<string, string>
  /** How it set: at what was said, or as somebody found it. Absent: nobody has said yet. */
  found?: 'as-said' | { outcome: 'wet' | 'spoiled'; atTime: string }
}

type Doer = DemoEntry['by']

const entry = (night: number, at: string, by: Doer, kind: string, note = ''): DemoEntry => ({
  night,
  at,
  by,
  fields: { kind, note },
})
const flood = (night: number, at: string, by: Doer, found: DemoEntry['found'] = 'as-said'): DemoEntry => ({
  ...entry(night, at, by, 'flood'),
  found,
})

export const DEMO_LOG: readonly DemoEntry[] = [
  entry(0, '19:30', 'keeper', 'scrape'),
  flood(0, '20:00', 'keeper'),
  flood(0, '22:05', 'keeper'),
  flood(1, '20:10', 'crew'),
  flood(1, '22:15', 'crew'),
  entry(3, '16:50', 'crew', 'clear', 'Four centimetres, dry. Pushed over the north boards.'),
  entry(3, '19:40', 'keeper', 'scrape', 'Shavings off, two low spots by the gate filled.'),
  flood(3, '20:00', 'keeper'),
  flood(3, '22:00', 'keeper'),
  entry(4, '16:15', 'keeper', 'reading', 'Mean of four holes.'),
  flood(4, '20:20', 'crew'),
  entry(5, '21:30', 'keeper', 'thaw', 'Rain from nine, water standing along the south boards.'),
  entry(7, '17:30', 'crew', 'note', 'Everybody off until it is hard again. Sign is on the gate.'),
  entry(8, '19:45', 'keeper', 'note', 'A skin, and wet below it. Left alone tonight.'),
  flood(9, '17:15', 'crew', { outcome: 'spoiled', atTime: '18:40' }),
  entry(10, '16:40', 'crew', 'clear'),
  entry(10, '19:20', 'crew', 'scrape', 'The crust of last night is off.'),
  flood(10, '19:45', 'crew'),
  flood(10, '21:40', 'crew'),
  entry(
    11,
    '15:30',
    'keeper',
    'repair',
    'Joint of the boards at the north corner screwed down anew; a longer bracket is due.',
  ),
  flood(11, '20:05', 'keeper'),
  flood(11, '22:10', 'keeper'),
  entry(13, '16:45', 'crew', 'clear'),
  flood(13, '20:00', 'crew'),
  flood(14, '19:30', 'keeper', { outcome: 'wet', atTime: '23:30' }),
  entry(15, '16:10', 'keeper', 'reading', 'Mean of three holes.'),
  flood(15, '20:00', 'keeper'),
  flood(15, '22:00', 'keeper'),
  flood(16, '19:30', 'crew'),
  flood(16, '21:20', 'crew'),
  flood(17, '20:10', 'keeper'),
  entry(19, '16:40', 'crew', 'clear', 'Six centimetres, light.'),
  entry(19, '19:40', 'keeper', 'scrape'),
  flood(19, '20:02', 'keeper'),
  { ...entry(19, '22:04', 'keeper', 'flood') },
]
