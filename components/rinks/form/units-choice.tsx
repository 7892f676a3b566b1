// Metric or imperial: what is typed already is rewritten in the other.
import { ChoiceField } from '@/components/ui/choice-field'
import type { RinkForm } from './use-rink-form'

const CHOICES = [
  { value: 'metric', label: 'Metric', note: 'Metres, millimetres, litres, °C' },
  { value: 'imperial', label: 'Imperial', note: 'Feet, inches, US gallons, °F' },
]

export function UnitsChoice({ form }: { form: RinkForm }) {
  return (
    <ChoiceField
      legend="Your units"
      choices={CHOICES}
      {...form.choice('units')}
      onChoose={(value) => form.chooseUnits(value === 'imperial' ? 'imperial' : 'metric')}
    />
  )
}
