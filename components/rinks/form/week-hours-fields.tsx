// The hours in which somebody can go out, row by row, each on its days of the week.
'use client'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { SelectField, TextField } from '@/components/ui/field'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { hoursField, MOST_ROWS, WEEKDAYS } from '@/lib/schemas/hours'
import type { RinkForm } from './use-rink-form'

const DAY_NAMES = ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday']

const isUsed = (form: RinkForm, row: number) =>
  Boolean(form.values[hoursField.from(row)] || form.values[hoursField.to(row)])

export function WeekHoursFields({ form }: { form: RinkForm }) {
  const isHydrated = useHydrated()
  const rows = Array.from({ length: MOST_ROWS }, (_, index) => index + 1)
  const [shown, setShown] = useState(() => rows.filter((row) => isUsed(form, row)).length)
  const count = Math.max(shown, 1)
  const add = () => {
    form.set(Object.fromEntries(WEEKDAYS.map((day) => [hoursField.day(count + 1, day), 'on'])))
    setShown(count + 1)
  }
  return (
    <>
      <p className="mb-3 max-w-line text-note text-graphite">
        Only these hours are advised. Times are the rink’s own; an end before the start runs past midnight and belongs
        to the day on which it starts. A row without times is left out.
      </p>
      {(isHydrated ? rows.slice(0, count) : rows).map((row) => (
        <HoursRow key={row} form={form} row={row} />
      ))}
      {isHydrated && count < MOST_ROWS ? (
        <Button onClick={add} className="mb-6">
          Add hours
        </Button>
      ) : null}
      <SelectField label="Most passes in one night" {...form.text('maxPasses')}>
        {['1', '2', '3', '4', '5', '6'].map((passes) => (
          <option key={passes}>{passes}</option>
        ))}
      </SelectField>
    </>
  )
}

function HoursRow({ form, row }: { form: RinkForm; row: number }) {
  const isHydrated = useHydrated()
  const clear = () => form.set({ [hoursField.from(row)]: '', [hoursField.to(row)]: '' })
  return (
    <fieldset className="mb-6 border-t border-rule pt-4">
      <legend className="sr-only">Hours {row}</legend>
      <div className="grid grid-cols-2 gap-4">
        <TextField label="From" type="time" {...form.text(hoursField.from(row))} />
        <TextField label="Until" type="time" {...form.text(hoursField.to(row))} />
      </div>
      <div className="flex flex-wrap gap-x-2" role="group" aria-label="Days on which they start">
        {WEEKDAYS.map((day) => (
          <DayTick key={day} day={DAY_NAMES[day - 1] ?? ''} {...form.tick(hoursField.day(row, day))} />
        ))}
      </div>
      {isHydrated && isUsed(form, row) ? <Button onClick={clear}>Leave these out</Button> : null}
    </fieldset>
  )
}

function DayTick({
  day,
  name,
  checked,
  onChange,
}: {
  day: string
  name: string
  checked: boolean
  onChange: (event: { target: { checked: boolean } }) => void
}) {
  return (
    <label className="inline-flex min-h-touch min-w-touch cursor-pointer items-center gap-2 pr-2">
      <input
        type="checkbox"
        name={name}
        checked={checked}
        onChange={onChange}
        className="size-5 accent-ink"
        aria-label={day}
      />
      <span aria-hidden="true">{day.slice(0, 3)}</span>
    </label>
  )
}
