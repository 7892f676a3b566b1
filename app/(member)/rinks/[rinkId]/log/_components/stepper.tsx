// A number with large buttons for less and more: for gloves. Without script it is a plain field.
'use client'
import { useRef } from 'react'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { describedBy, FieldFrame } from '@/components/ui/field'

interface StepperProps {
  label: string
  name: string
  unit: string
  /** How far one press goes, in the unit shown. */
  step: number
  least?: number
  defaultValue: string
  hint?: string
  error?: string
  /** Where the first press starts when the field is empty. */
  from?: number
}

const PRESS =
  'grid size-14 shrink-0 cursor-pointer place-items-center rounded border-[1.5px] border-ink text-lead font-medium text-ink'

export function Stepper({ label, name, unit, step, least = 0, defaultValue, hint, error, from = 0 }: StepperProps) {
  const input = useRef<HTMLInputElement>(null)
  const isHydrated = useHydrated()

  function press(direction: 1 | -1) {
    if (!input.current) return
    const typed = input.current.value.trim()
    const value = typed === '' ? from : Number(typed.replace(',', '.'))
    if (Number.isNaN(value)) return
    input.current.value = String(Number(Math.max(least, value + direction * step).toFixed(2)))
  }

  const button = (direction: 1 | -1) => (
    <button
      type="button"
      className={PRESS}
      aria-label={direction === 1 ? `${label}: more` : `${label}: less`}
      onClick={() => press(direction)}
    >
      {direction === 1 ? '+' : '−'}
    </button>
  )
  return (
    <FieldFrame label={label} name={name} hint={hint} error={error}>
      <div className="flex items-center gap-2">
        {isHydrated ? button(-1) : null}
        <input
          ref={input}
          id={name}
          name={name}
          inputMode="decimal"
          autoComplete="off"
          defaultValue={defaultValue}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ name, hint, error })}
          className="min-h-14 w-24 rounded border-[1.5px] border-graphite bg-sheet px-2 text-center text-lead text-ink aria-invalid:border-rust"
        />
        {isHydrated ? button(1) : null}
        <span className="shrink-0 text-graphite">{unit}</span>
      </div>
    </FieldFrame>
  )
}
