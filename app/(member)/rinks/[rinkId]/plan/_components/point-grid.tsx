// A grid of depths to fill in, row by row, by keyboard or by thumb: Enter and the arrows up and down go on along a column.
'use client'
import type { KeyboardEvent } from 'react'
import { TextField } from '@/components/ui/field'
import { GRID, pointField } from '@/lib/schemas/build-plan'
import { unitOf } from '@/lib/schemas/measures'
import type { Units } from '@/lib/units'
import type { PlanForm } from './use-plan-form'

const STEPS: Record<string, number> = { Enter: 1, ArrowDown: 1, ArrowUp: -1 }

export function PointGrid({ form, units }: { form: PlanForm; units: Units }) {
  const rows = countOf(form.values.rows)
  const columns = countOf(form.values.columns)
  return (
    <>
      <div className="grid grid-cols-2 gap-x-4">
        <TextField label="Points along the length" inputMode="numeric" {...form.field('rows')} />
        <TextField label="Points across the width" inputMode="numeric" {...form.field('columns')} />
      </div>
      <fieldset className="mb-5">
        <legend className="font-medium">Each point below the string, {unitOf('drop', units)}</legend>
        <p className="mb-2 text-note text-graphite">
          The first and last points lie at the boards; an empty one lies at the string.
        </p>
        <div role="region" aria-label="Points" tabIndex={0} className="overflow-x-auto pb-1">
          {steps(rows).map((row) => (
            <div key={row} className="mb-1 flex gap-1">
              {steps(columns).map((column) => (
                <Point key={column} form={form} row={row} column={column} />
              ))}
            </div>
          ))}
        </div>
        <Faults form={form} rows={rows} columns={columns} />
      </fieldset>
    </>
  )
}

function Point({ form, row, column }: { form: PlanForm; row: number; column: number }) {
  const name = pointField(row, column)
  const { error, ...field } = form.field(name)
  const goOn = (event: KeyboardEvent<HTMLInputElement>) => {
    const step = STEPS[event.key]
    const next = step && document.getElementById(pointField(row + step, column))
    if (!step) return
    // Enter in a field would send the form.
    event.preventDefault()
    if (next instanceof HTMLInputElement) next.select()
  }
  return (
    <input
      id={name}
      inputMode="decimal"
      autoComplete="off"
      aria-label={`Row ${row}, point ${column}`}
      aria-invalid={error ? true : undefined}
      aria-describedby={error ? 'points-error' : undefined}
      onKeyDown={goOn}
      className="min-h-touch w-16 min-w-12 flex-1 rounded border-[1.5px] border-graphite bg-sheet px-1 text-center text-body text-ink aria-invalid:border-rust"
      {...field}
    />
  )
}

function Faults({ form, rows, columns }: { form: PlanForm; rows: number; columns: number }) {
  const faults = steps(rows).flatMap((row) =>
    steps(columns).flatMap((column) => {
      const message = form.error(pointField(row, column))
      return message ? [`Row ${row}, point ${column}: ${message}`] : []
    }),
  )
  if (faults.length === 0) return null
  return (
    <p id="points-error" className="mt-1 text-note text-rust">
      {faults[0]}
    </p>
  )
}

export const steps = (count: number) => Array.from({ length: count }, (_, index) => index + 1)

/** While a count is being typed it may be none. */
export function countOf(text: string | undefined): number {
  const count = Math.trunc(Number(text))
  return Number.isNaN(count) ? GRID.least : Math.min(GRID.most, Math.max(GRID.least, count))
}
