// What there is now: the phase of the season, the ice on the ground, the water in the liner.
import { SelectField, TextField } from '@/components/ui/field'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { hasIce, PHASES } from '@/lib/schemas/rink-choices'
import { PHASE_WORDS } from '../choice-words'
import type { RinkForm } from './use-rink-form'

/** Only while a rink runs do these two make sense as an answer. */
const LATE_PHASES = ['thaw', 'closed']

export function IceFields({ form, isNew }: { form: RinkForm; isNew: boolean }) {
  const isHydrated = useHydrated()
  const phase = PHASES.find((name) => name === form.values.phase) ?? 'waiting'
  const phases = PHASES.filter((name) => !isNew || !LATE_PHASES.includes(name))
  return (
    <>
      <SelectField label="What is there now?" {...form.text('phase')}>
        {phases.map((name) => (
          <option key={name} value={name}>
            {PHASE_WORDS[name]}
          </option>
        ))}
      </SelectField>
      <div hidden={isHydrated && !hasIce(phase)}>
        <TextField
          label="Ice thickness"
          inputMode="decimal"
          hint={
            isNew
              ? 'Where there is ice: drill or chop a hole and measure.'
              : 'Fill in only what you measured just now; the model goes on from there.'
          }
          {...form.text('iceThickness')}
        />
      </div>
      {isNew ? <FillDepthField form={form} /> : null}
    </>
  )
}

/** Only a liner holds a fill. */
export function FillDepthField({ form }: { form: RinkForm }) {
  const isHydrated = useHydrated()
  return (
    <div hidden={isHydrated && form.values.base !== 'liner'}>
      <TextField
        label="Water in the liner when full"
        inputMode="decimal"
        hint="Mean depth. Shallow freezes through sooner."
        {...form.text('fillDepth')}
      />
    </div>
  )
}
