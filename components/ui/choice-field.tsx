// One choice out of a few, all in sight; and a box to tick. Each is a target of 48 px, label included.
import type { InputHTMLAttributes, ReactNode } from 'react'

export interface Choice {
  value: string
  label: string
  /** What the label leaves open. */
  note?: string
  picture?: ReactNode
}

const ROW =
  'flex min-h-touch cursor-pointer items-center gap-3 border-b border-rule py-2 has-checked:font-medium has-focus-visible:outline-[3px] ' +
  'has-focus-visible:outline-offset-[-1px] has-focus-visible:outline-hose'
const MARK = 'size-5 shrink-0 accent-ink focus-visible:outline-none'

export function ChoiceField({
  legend,
  name,
  choices,
  value,
  onChoose,
  hint,
  error,
}: {
  legend: string
  name: string
  choices: readonly Choice[]
  value: string
  onChoose: (value: string) => void
  hint?: ReactNode
  error?: string
}) {
  return (
    <fieldset
      className="mb-6"
      aria-invalid={error ? true : undefined}
      aria-describedby={error ? `${name}-error` : undefined}
    >
      <legend className="font-medium">{legend}</legend>
      {hint ? <p className="text-note text-graphite">{hint}</p> : null}
      {choices.map((choice) => (
        <label key={choice.value} className={ROW}>
          <input
            type="radio"
            name={name}
            value={choice.value}
            checked={value === choice.value}
            onChange={() => onChoose(choice.value)}
            className={MARK}
          />
          <span className="grow">
            {choice.label}
            {choice.note ? <span className="block text-note font-normal text-graphite">{choice.note}</span> : null}
          </span>
          {choice.picture}
        </label>
      ))}
      {error ? (
        <p id={`${name}-error`} className="mt-1 text-note text-rust">
          {error}
        </p>
      ) : null}
    </fieldset>
  )
}

export function TickField({
  label,
  note,
  ...rest
}: { label: string; note?: ReactNode } & InputHTMLAttributes<HTMLInputElement>) {
  return (
    <label className={ROW}>
      <input type="checkbox" className={MARK} {...rest} />
      <span>
        {label}
        {note ? <span className="block text-note font-normal text-graphite">{note}</span> : null}
      </span>
    </label>
  )
}
