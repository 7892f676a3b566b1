// The water: where it comes from, how fast, how warm, and how much goes down in one pass.
import { Disclosure } from '@/components/ui/disclosure'
import { SelectField, TextField } from '@/components/ui/field'
import { typed, unitOf } from '@/lib/schemas/measures'
import { WATER_DEFAULTS, WATER_KINDS } from '@/lib/schemas/rink-choices'
import { WATER_WORDS } from '../choice-words'
import { BucketTest } from './bucket-test'
import type { RinkForm } from './use-rink-form'

export function WaterFields({ form }: { form: RinkForm }) {
  const kind = WATER_KINDS.find((name) => name === form.values.waterKind) ?? 'cold-tap'
  const usual = WATER_DEFAULTS[kind]
  const usualFlow = `${typed('flow', form.units, usual.flowLPerMin)} ${unitOf('flow', form.units)}`
  const usualWarmth = `${typed('waterTemperature', form.units, usual.temperatureC)} ${unitOf('waterTemperature', form.units)}`
  const isFaulty = Boolean(form.error('bucketSize') ?? form.error('bucketSeconds'))
  return (
    <>
      <SelectField label="Where does the water come from?" {...form.text('waterKind')}>
        {WATER_KINDS.map((name) => (
          <option key={name} value={name}>
            {WATER_WORDS[name]}
          </option>
        ))}
      </SelectField>
      <TextField
        label="Flow"
        inputMode="decimal"
        hint={`If you leave it empty, we reckon with ${usualFlow}.`}
        {...form.text('flow')}
      />
      <Disclosure summary="Measure the flow with a bucket" className="mb-5" open={isFaulty}>
        <BucketTest form={form} />
      </Disclosure>
      <TextField
        label="Water temperature"
        inputMode="decimal"
        hint={`At the nozzle. If you leave it empty, ${usualWarmth}.`}
        {...form.text('waterTemperature')}
      />
      <TextField
        label="Water in one pass"
        inputMode="decimal"
        hint="Depth on the ice. Thin layers set hard; thick ones stay soft."
        {...form.text('layer')}
      />
    </>
  )
}
