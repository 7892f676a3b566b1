// When it happened: minutes ago in a few presses, or a day and a time by the rink's clock.
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import type { FormState } from '@/lib/http/form-state'
import type { EntryValues } from './entry-values'
import { Stepper } from './stepper'

interface WhenProps {
  values: EntryValues
  faults: NonNullable<FormState['fields']>
}

const MINUTES_STEP = 5

export function AgoFields({ values, faults }: WhenProps) {
  return (
    <Stepper
      label="Minutes ago"
      name="minutesAgo"
      unit="min"
      step={MINUTES_STEP}
      defaultValue={values.minutesAgo ?? '0'}
      error={faults.minutesAgo}
    />
  )
}

export function DayAndTime({ values, faults, isNew }: WhenProps & { isNew: boolean }) {
  return (
    <>
      <div className="grid grid-cols-2 gap-x-4">
        <TextField label="Day" name="onDate" type="date" defaultValue={values.onDate ?? ''} error={faults.onDate} />
        <TextField label="Time" name="atTime" type="time" defaultValue={values.atTime ?? ''} error={faults.atTime} />
      </div>
      {faults.whichHour || values.whichHour ? <WhichHour error={faults.whichHour} chosen={values.whichHour} /> : null}
      {isNew ? <p className="mb-5 text-note text-graphite">A time given here counts instead of the minutes.</p> : null}
    </>
  )
}

/** In the night the clock is set back, one hour comes twice. */
function WhichHour({ error, chosen }: { error?: string; chosen?: string }) {
  const choices = [
    { value: 'first', label: 'The first time, before the clock was set back' },
    { value: 'second', label: 'The second time, after it' },
  ]
  return (
    <fieldset className="mb-5" aria-invalid={error ? true : undefined} aria-describedby={error && 'which-hour-error'}>
      <legend className="font-medium">Which of the two?</legend>
      {error ? (
        <p id="which-hour-error" className="text-note text-rust">
          {error}
        </p>
      ) : null}
      {choices.map(({ value, label }) => (
        <label key={value} className="flex min-h-touch items-center gap-3">
          <input
            type="radio"
            name="whichHour"
            value={value}
            defaultChecked={chosen === value}
            className="size-5 accent-ink"
          />
          {label}
        </label>
      ))}
    </fieldset>
  )
}

export function AnotherTime(props: WhenProps) {
  const { faults } = props
  const needsALook = Boolean(faults.onDate ?? faults.atTime ?? faults.whichHour)
  return (
    <Disclosure summary="Another day or time" open={needsALook || undefined}>
      <DayAndTime {...props} isNew />
    </Disclosure>
  )
}
