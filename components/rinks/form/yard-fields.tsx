// The yard: size and floor, what keeps the wind off, how much sky there is.
import { ChoiceField } from '@/components/ui/choice-field'
import { TextField } from '@/components/ui/field'
import { SHELTER_PICTURES } from './pictures'
import type { RinkForm } from './use-rink-form'

export const BASE_CHOICES = [
  { value: 'liner', label: 'A liner', note: 'Plastic sheet that holds water inside boards or banks.' },
  { value: 'ground', label: 'Bare ground', note: 'Grass, gravel or asphalt, wetted and built up in layers.' },
  { value: 'snow', label: 'Packed snow', note: 'Snow tramped flat and soaked.' },
]

export const SHELTER_CHOICES = [
  { value: 'open', label: 'Open', note: 'Field or park: wind arrives unhindered.', picture: SHELTER_PICTURES.open },
  {
    value: 'suburban',
    label: 'Partly sheltered',
    note: 'Houses, hedges or trees some way off.',
    picture: SHELTER_PICTURES.suburban,
  },
  {
    value: 'tight',
    label: 'Sheltered',
    note: 'Yard with walls, fences or houses close by.',
    picture: SHELTER_PICTURES.tight,
  },
]

const SKY_CHOICES = [
  { value: 'wide', label: 'Almost all of it', note: 'Nothing higher than a fence far away.' },
  { value: 'edged', label: 'Most of it', note: 'Roofs and trees stand along the edges.' },
  { value: 'yard', label: 'About two thirds', note: 'Houses or tall trees on two or three sides.' },
  { value: 'closed-in', label: 'Less than half', note: 'Walls close by, or branches overhead.' },
]

interface Props {
  form: RinkForm
  /** A share of sky that was set by hand, in words: it may stay as it is. */
  keptSky?: string
}

export function YardFields({ form, keptSky }: Props) {
  const kept = keptSky ? [{ value: 'kept', label: keptSky, note: 'As it was set for this rink.' }] : []
  return (
    <>
      <SizeFields form={form} />
      <ChoiceField legend="What does it lie on?" choices={BASE_CHOICES} {...form.choice('base')} />
      <ChoiceField legend="How does the wind reach it?" choices={SHELTER_CHOICES} {...form.choice('shelter')} />
      <ChoiceField
        legend="How much of the sky does it see?"
        hint="Lie down in the middle and look up: open sky draws heat out of the water. What each answer counts for is our own estimate."
        choices={[...kept, ...SKY_CHOICES]}
        {...form.choice('sky')}
      />
    </>
  )
}

function SizeFields({ form }: { form: RinkForm }) {
  return (
    <div className="grid grid-cols-2 gap-4">
      <TextField label="Length" inputMode="decimal" {...form.text('length')} />
      <TextField label="Width" inputMode="decimal" {...form.text('width')} />
    </div>
  )
}
