// The settings form: the fields of set-up, filled in.
'use client'
import { RinkFormFrame } from '@/components/rinks/form/frame'
import { HoursFields } from '@/components/rinks/form/hours-fields'
import { IceFields } from '@/components/rinks/form/ice-fields'
import { PlaceFields } from '@/components/rinks/form/place-fields'
import { Step } from '@/components/rinks/form/step'
import { useRinkForm } from '@/components/rinks/form/use-rink-form'
import type { FormValues } from '@/components/rinks/form/values'
import { WaterFields } from '@/components/rinks/form/water-fields'
import { YardFields } from '@/components/rinks/form/yard-fields'
import { TextField } from '@/components/ui/field'
import { changeRinkAction } from '../actions'

export function SettingsForm({ initial }: { initial: FormValues }) {
  const form = useRinkForm(changeRinkAction, initial)
  return (
    <RinkFormFrame form={form} submit="Save" busy="Saving">
      <input type="hidden" name="rinkId" value={form.values.rinkId} />
      <input type="hidden" name="units" value={form.values.units} />
      <Step number={1} title="Ice now">
        <IceFields form={form} isNew={false} />
      </Step>
      <Step number={2} title="Water">
        <WaterFields form={form} />
      </Step>
      <Step number={3} title="Hours">
        <HoursFields form={form} />
      </Step>
      <Step number={4} title="Name and place">
        <TextField label="Name" maxLength={60} autoComplete="off" {...form.text('name')} />
        <PlaceFields form={form} />
      </Step>
      <Step number={5} title="The yard">
        <YardFields form={form} />
      </Step>
    </RinkFormFrame>
  )
}
