// The forms of the settings pages: the fields of set-up, filled in, and what only settings ask.
'use client'
import { FloorFields } from '@/components/rinks/form/floor-fields'
import { RinkFormFrame } from '@/components/rinks/form/frame'
import { IceFields } from '@/components/rinks/form/ice-fields'
import { ClockFields, PlaceFields } from '@/components/rinks/form/place-fields'
import { useRinkForm } from '@/components/rinks/form/use-rink-form'
import type { FormValues } from '@/components/rinks/form/values'
import { WeekHoursFields } from '@/components/rinks/form/week-hours-fields'
import { YardFields } from '@/components/rinks/form/yard-fields'
import { TextField } from '@/components/ui/field'
import { changeHoursAction, changeIceAction, changeLimitsAction, changePlaceAction, changeYardAction } from '../actions'
import { Hidden } from './hidden'

interface Props {
  initial: FormValues
}

const SAVE = { submit: 'Save', busy: 'Saving' }

export function PlaceForm({ initial }: Props) {
  const form = useRinkForm(changePlaceAction, initial)
  return (
    <RinkFormFrame form={form} {...SAVE}>
      <Hidden form={form} names={['rinkId']} />
      <TextField label="Name" maxLength={60} autoComplete="off" {...form.text('name')} />
      <PlaceFields form={form} asksWhoseClock />
      <ClockFields form={form} />
    </RinkFormFrame>
  )
}

export function YardForm({ initial, keptSky }: Props & { keptSky?: string }) {
  const form = useRinkForm(changeYardAction, initial)
  return (
    <RinkFormFrame form={form} {...SAVE}>
      <Hidden form={form} names={['rinkId', 'units']} />
      <YardFields form={form} keptSky={keptSky} />
      <FloorFields form={form} />
    </RinkFormFrame>
  )
}

export function IceForm({ initial }: Props) {
  const form = useRinkForm(changeIceAction, initial)
  return (
    <RinkFormFrame form={form} {...SAVE}>
      <Hidden form={form} names={['rinkId', 'units']} />
      <IceFields form={form} isNew={false} />
    </RinkFormFrame>
  )
}

export function HoursForm({ initial }: Props) {
  const form = useRinkForm(changeHoursAction, initial)
  return (
    <RinkFormFrame form={form} {...SAVE}>
      <Hidden form={form} names={['rinkId']} />
      <WeekHoursFields form={form} />
    </RinkFormFrame>
  )
}

export function LimitsForm({ initial }: Props) {
  const form = useRinkForm(changeLimitsAction, initial)
  return (
    <RinkFormFrame form={form} {...SAVE}>
      <Hidden form={form} names={['rinkId', 'units']} />
      <TextField
        label="Most wind at the rink"
        inputMode="decimal"
        hint="Above it no flood is advised. Empty leaves it to the model, which marks wind down bit by bit."
        {...form.text('windLimit')}
      />
      <TextField
        label="Least wind chill"
        inputMode="decimal"
        hint="Colder than this, nobody is sent out. Empty leaves it to the model, which goes by frostbite times."
        {...form.text('windChillLimit')}
      />
      <TextField
        label="Ice that carries skaters"
        inputMode="decimal"
        hint="Drilled, not reckoned. The usual advice for ice on land is 10 cm, which is 4 in."
        {...form.text('carriesSkater')}
      />
    </RinkFormFrame>
  )
}
