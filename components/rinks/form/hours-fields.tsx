// When the keeper can go out, and how often in one night.
'use client'
import { useState } from 'react'
import { Disclosure } from '@/components/ui/disclosure'
import { SelectField, TextField } from '@/components/ui/field'
import type { RinkForm } from './use-rink-form'

export function HoursFields({ form }: { form: RinkForm }) {
  const [startsOpen] = useState(Boolean(form.values.moreHoursFrom))
  const isFaulty = Boolean(form.error('moreHoursFrom') ?? form.error('moreHoursTo'))
  return (
    <>
      <p className="mb-3 max-w-line text-note text-graphite">
        Only these hours are advised. Times are the rink’s own; an end before the start runs past midnight.
      </p>
      <div className="grid grid-cols-2 gap-4">
        <TextField label="From" type="time" {...form.text('hoursFrom')} />
        <TextField label="Until" type="time" {...form.text('hoursTo')} />
      </div>
      <Disclosure summary="Add hours, such as early morning" className="mb-5" open={startsOpen || isFaulty}>
        <div className="grid grid-cols-2 gap-4">
          <TextField label="Also from" type="time" {...form.text('moreHoursFrom')} />
          <TextField label="Until" type="time" {...form.text('moreHoursTo')} />
        </div>
      </Disclosure>
      <SelectField label="Most passes in one night" {...form.text('maxPasses')}>
        {['1', '2', '3', '4', '5', '6'].map((count) => (
          <option key={count}>{count}</option>
        ))}
      </SelectField>
    </>
  )
}
