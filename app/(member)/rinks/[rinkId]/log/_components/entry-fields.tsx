// The fields of an entry by its kind: what is needed in sight, what has a sensible default one tap away.
import { Disclosure } from '@/components/ui/disclosure'
import { describedBy, FieldFrame, SelectField, TextField } from '@/components/ui/field'
import type { FormState } from '@/lib/http/form-state'
import { NOTE_LENGTH, type LogKind } from '@/lib/schemas/log-choices'
import { scaleOf, unitOf } from '@/lib/schemas/measures'
import { WATER_KINDS } from '@/lib/schemas/rink-choices'
import type { Units } from '@/lib/units'
import { READING_HINT, WATER_KIND_WORDS } from '@/lib/words/log'
import { capitalised } from '@/lib/words/quantities'
import type { EntryValues } from './entry-values'
import { Stepper } from './stepper'

export interface FieldsProps {
  kind: LogKind
  units: Units
  values: EntryValues
  faults: NonNullable<FormState['fields']>
}

const NOTE_LABELS: Partial<Record<LogKind, string>> = { repair: 'What was mended', note: 'Note', thaw: 'What it did' }
/** One press: half a millimetre of layer, half a centimetre of ice, or about that in inches. */
const PRESSES = { layer: { cm: 0.5, in: 0.02 }, ice: { cm: 0.5, in: 0.25 } }

export function MainFields(props: FieldsProps) {
  const { kind, units, values, faults } = props
  if (kind === 'flood') {
    return (
      <Stepper
        label="Layer"
        name="layer"
        unit={unitOf('layer', units)}
        step={PRESSES.layer[units.ice]}
        defaultValue={values.layer ?? ''}
        error={faults.layer}
      />
    )
  }
  if (kind === 'fill') return <WaterAmount {...props} />
  if (kind === 'reading') {
    return (
      <Stepper
        label="Thickness"
        name="thickness"
        unit={unitOf('iceThickness', units)}
        step={PRESSES.ice[units.ice]}
        from={scaleOf('iceThickness', units).fromSi(100)}
        defaultValue={values.thickness ?? ''}
        hint={READING_HINT}
        error={faults.thickness}
      />
    )
  }
  return kind === 'repair' || kind === 'note' ? <Note {...props} /> : null
}

/** What is only asked for when somebody wants to say it. */
export function MoreFields(props: FieldsProps) {
  const { kind, faults } = props
  const isNoteInSight = kind === 'repair' || kind === 'note'
  if (kind === 'flood' || kind === 'fill') {
    const needsALook = Boolean(faults.water ?? faults.waterTemperature ?? faults.waterKind ?? faults.note)
    return (
      <Disclosure summary="Water and note" open={needsALook || undefined}>
        <Water {...props} />
        <Note {...props} />
      </Disclosure>
    )
  }
  if (isNoteInSight) return null
  return (
    <Disclosure summary="Add a note" open={faults.note ? true : undefined}>
      <Note {...props} />
    </Disclosure>
  )
}

function WaterAmount({ kind, units, values, faults }: FieldsProps) {
  return (
    <TextField
      label="Water"
      name="water"
      unit={unitOf('bucket', units)}
      inputMode="decimal"
      autoComplete="off"
      defaultValue={values.water ?? ''}
      hint={kind === 'flood' ? 'Left empty, it is the layer times the area of the rink.' : undefined}
      error={faults.water}
    />
  )
}

export function Water(props: FieldsProps) {
  const { kind, units, values, faults } = props
  return (
    <>
      <SelectField label="Water from" name="waterKind" defaultValue={values.waterKind} error={faults.waterKind}>
        {WATER_KINDS.map((waterKind) => (
          <option key={waterKind} value={waterKind}>
            {capitalised(WATER_KIND_WORDS[waterKind])}
          </option>
        ))}
      </SelectField>
      {kind === 'flood' ? <WaterAmount {...props} /> : null}
      <TextField
        label="Water temperature"
        name="waterTemperature"
        unit={unitOf('waterTemperature', units)}
        inputMode="decimal"
        autoComplete="off"
        defaultValue={values.waterTemperature ?? ''}
        hint="Left empty, it is what this source usually gives."
        error={faults.waterTemperature}
      />
    </>
  )
}

export function Note({ kind, values, faults }: FieldsProps) {
  const label = NOTE_LABELS[kind] ?? 'Note'
  return (
    <FieldFrame label={label} name="note" error={faults.note}>
      <textarea
        id="note"
        name="note"
        rows={3}
        maxLength={NOTE_LENGTH}
        defaultValue={values.note ?? ''}
        aria-invalid={faults.note ? true : undefined}
        aria-describedby={describedBy({ name: 'note', error: faults.note })}
        className="w-full rounded border-[1.5px] border-graphite bg-sheet px-3 py-2 text-body text-ink aria-invalid:border-rust"
      />
    </FieldFrame>
  )
}
