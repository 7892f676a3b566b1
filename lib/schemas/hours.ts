// The hours in which somebody can go out, as rows of a form: from, until, and a box for each weekday.
import type { z } from 'zod'
import { refuserIn } from './fields'
import { clockTimeSchema, shareAMinute, type WeekHours } from './local-time'

export const MOST_ROWS = 6
export const WEEKDAYS = [1, 2, 3, 4, 5, 6, 7] as const

/** Names of a row's fields; rows count from 1. */
export const hoursField = {
  from: (row: number) => `from${row}`,
  to: (row: number) => `to${row}`,
  day: (row: number, day: number) => `day${row}_${day}`,
}

/** Rows that are filled in; an empty one is left out. Faults go to the field that they belong to. */
export function readHours(fields: Record<string, unknown>, context: z.RefinementCtx): WeekHours[] {
  const refuse = refuserIn(context)
  const rows: (WeekHours & { row: number })[] = []
  for (let row = 1; row <= MOST_ROWS; row++) {
    const [from, to] = [fields[hoursField.from(row)] || '', fields[hoursField.to(row)] || '']
    if (from === '' && to === '') continue
    const hours = readRow(row, { from, to }, fields, refuse)
    if (!hours) continue
    if (rows.some((earlier) => shareAMinute(earlier, hours))) {
      refuse(hoursField.from(row), 'These hours run into others above.')
    }
    rows.push({ ...hours, row })
  }
  if (rows.length === 0 && context.issues.length === 0) refuse(hoursField.from(1), 'At least one stretch of hours.')
  return rows.map(({ from, to, weekdays }) => ({ from, to, weekdays }))
}

function readRow(
  row: number,
  typed: { from: unknown; to: unknown },
  fields: Record<string, unknown>,
  refuse: ReturnType<typeof refuserIn>,
): WeekHours | undefined {
  const [from, to] = [clockTimeSchema.safeParse(typed.from), clockTimeSchema.safeParse(typed.to)]
  const weekdays = WEEKDAYS.filter((day) => fields[hoursField.day(row, day)] === 'on')
  if (!from.success) refuse(hoursField.from(row), 'Type a time, like 17:00.')
  if (!to.success) refuse(hoursField.to(row), 'Type a time, like 23:00.')
  if (!from.success || !to.success) return undefined
  if (from.data === to.data) refuse(hoursField.to(row), 'These hours end when they start.')
  if (weekdays.length === 0) refuse(hoursField.from(row), 'Tick at least one day for these hours.')
  return { from: from.data, to: to.data, weekdays }
}
