// The water and the boards: depth, flow, hours, price, height, and the autumn it is for.
'use client'
import { Disclosure } from '@/components/ui/disclosure'
import { SelectField, TextField } from '@/components/ui/field'
import { seasonName, seasonOfYear } from '@/lib/advice/season'
import { unitOf } from '@/lib/schemas/measures'
import type { Units } from '@/lib/units'
import type { PlanForm } from './use-plan-form'

export function WaterFields({ form, units, years }: { form: PlanForm; units: Units; years: readonly number[] }) {
  const measured = (name: string, measure: Parameters<typeof unitOf>[0]) => ({
    inputMode: 'decimal' as const,
    unit: unitOf(measure, units),
    ...form.field(name),
  })
  const isTimed = Boolean(form.values.bucketSeconds) || Boolean(form.error('bucketSize'))
  return (
    <>
      <TextField label="Least water over the high corner" {...measured('leastDepth', 'leastDepth')} />
      <TextField label="Flow" hint="All hoses together." {...measured('flow', 'flow')} />
      <Disclosure summary="Measure the flow with a bucket" className="mb-5" open={isTimed}>
        <p className="mb-3 text-note text-graphite">
          Let the hose run at its full length into a bucket and time it until full. Filled in, these count instead of
          the flow above.
        </p>
        <div className="grid grid-cols-2 gap-x-4">
          <TextField label="Bucket" {...measured('bucketSize', 'bucket')} />
          <TextField label="Fills in" inputMode="decimal" unit="s" {...form.field('bucketSeconds')} />
        </div>
      </Disclosure>
      <div className="grid grid-cols-2 items-end gap-x-4">
        <TextField label="Hose in one go" inputMode="decimal" unit="h" {...form.field('hoursInOneGo')} />
        <TextField label="Price of water" {...measured('waterPrice', 'waterPrice')} />
        <TextField label="Board above the water" {...measured('freeboard', 'freeboard')} />
        <TextField label="Boards you have" {...measured('boardHeight', 'boardHeight')} />
      </div>
      <SelectField label="For the winter" {...form.field('season')}>
        {years.map((year) => (
          <option key={year} value={year}>
            {seasonName(seasonOfYear(year))}
          </option>
        ))}
      </SelectField>
    </>
  )
}
