// Metric or US customary, quickly; what is typed already is rewritten in the other. One by one is for the account page.
import { ChoiceField } from '@/components/ui/choice-field'
import { IMPERIAL, unitsCode, unitsOfCode, type Units } from '@/lib/units'
import { choicesOfUnits } from './unit-choices'
import type { RinkForm } from './use-rink-form'

const SIZES = { m: 'Metres', ft: 'Feet' }
const ICE = { cm: 'centimetres', in: 'inches' }
const WATER = { L: 'litres', gal: 'US gallons' }

function labelOf(units: Units, isMetric: boolean): string {
  if (isMetric) return 'Metric'
  return unitsCode(units) === unitsCode(IMPERIAL) ? 'US customary' : 'As in your account'
}

export function UnitsChoice({ form }: { form: RinkForm }) {
  const choices = choicesOfUnits(form.offeredUnits).map(({ units, isMetric }) => ({
    value: unitsCode(units),
    label: labelOf(units, isMetric),
    note: `${SIZES[units.size]}, ${ICE[units.ice]}, ${WATER[units.water]}, °${units.temperature}, ${units.wind}`,
  }))
  const choose = (code: string) => {
    const units = unitsOfCode(code)
    if (units) form.chooseUnits(units)
  }
  return <ChoiceField legend="Your units" choices={choices} {...form.choice('units')} onChoose={choose} />
}
