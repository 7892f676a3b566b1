// The set-up form: one column, four steps on one page; sent twice, it makes one rink.
'use client'
import { RinkFormFrame } from '@/components/rinks/form/frame'
import { HoursFields } from '@/components/rinks/form/hours-fields'
import { IceFields } from '@/components/rinks/form/ice-fields'
import { PlaceFields } from '@/components/rinks/form/place-fields'
import { Step } from '@/components/rinks/form/step'
import { UnitsChoice } from '@/components/rinks/form/units-choice'
import { useRinkForm } from '@/components/rinks/form/use-rink-form'
import type { FormValues } from '@/components/rinks/form/values'
import { WaterFields } from '@/components/rinks/form/water-fields'
import { YardFields } from '@/components/rinks/form/yard-fields'
import { TextField } from '@/components/ui/field'
import { setUpRinkAction } from '../actions'
import { ToldFields } from './told-fields'

export function SetUpForm({ initial, email, isFirst }: { initial: FormValues; email: string; isFirst: boolean }) {
  const form = useRinkForm(setUpRinkAction, initial, isFirst)
  return (
    <RinkFormFrame form={form} submit="Set up this rink" busy="Setting up">
      <input type="hidden" name="creationKey" value={form.values.creationKey} />
      <Step number={1} title="The rink">
        <TextField
          label="Name"
          hint="As you and your crew call it."
          maxLength={60}
          autoComplete="off"
          {...form.text('name')}
        />
        <PlaceFields form={form} />
      </Step>
      <Step number={2} title="The yard">
        <UnitsChoice form={form} />
        <YardFields form={form} />
      </Step>
      <Step number={3} title="Ice and water">
        <IceFields form={form} isNew />
        <WaterFields form={form} />
      </Step>
      <Step number={4} title="You">
        <HoursFields form={form} />
        <ToldFields form={form} email={email} />
      </Step>
    </RinkFormFrame>
  )
}
