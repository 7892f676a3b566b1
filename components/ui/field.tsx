// Form fields: label above, hint under it, the fault beside the field and tied to it.
import type { InputHTMLAttributes, ReactNode, SelectHTMLAttributes, TextareaHTMLAttributes } from 'react'

interface Around {
  label: string
  name: string
  /** Where two forms of a page ask for the same; otherwise the name serves. */
  fieldId?: string
  hint?: ReactNode
  error?: string
}

const BOX =
  'min-h-touch w-full rounded border-[1.5px] border-graphite bg-sheet px-3 text-body text-ink aria-invalid:border-rust'

export function describedBy({ name, fieldId = name, hint, error }: Omit<Around, 'label'>): string | undefined {
  return [hint ? `${fieldId}-hint` : '', error ? `${fieldId}-error` : ''].filter(Boolean).join(' ') || undefined
}

export function FieldFrame({ label, name, fieldId = name, hint, error, children }: Around & { children: ReactNode }) {
  return (
    <div className="mb-5">
      <label htmlFor={fieldId} className="mb-1 block font-medium">
        {label}
      </label>
      {hint ? (
        <p id={`${fieldId}-hint`} className="mb-1 text-note text-graphite">
          {hint}
        </p>
      ) : null}
      {children}
      {error ? (
        <p id={`${fieldId}-error`} className="mt-1 text-note text-rust">
          {error}
        </p>
      ) : null}
    </div>
  )
}

export function TextField({
  label,
  name,
  fieldId = name,
  hint,
  error,
  unit,
  ...rest
}: Around & { unit?: string } & InputHTMLAttributes<HTMLInputElement>) {
  return (
    <FieldFrame label={label} name={name} fieldId={fieldId} hint={hint} error={error}>
      <div className="flex items-center gap-2">
        <input
          id={fieldId}
          name={name}
          className={BOX}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ name, fieldId, hint, error })}
          {...rest}
        />
        {unit ? <span className="shrink-0 text-graphite">{unit}</span> : null}
      </div>
    </FieldFrame>
  )
}

export function AreaField({ label, name, hint, error, ...rest }: Around & TextareaHTMLAttributes<HTMLTextAreaElement>) {
  return (
    <FieldFrame label={label} name={name} hint={hint} error={error}>
      <textarea
        id={name}
        name={name}
        className={`${BOX} py-2`}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ name, hint, error })}
        {...rest}
      />
    </FieldFrame>
  )
}

export function SelectField({ label, name, hint, error, ...rest }: Around & SelectHTMLAttributes<HTMLSelectElement>) {
  return (
    <FieldFrame label={label} name={name} hint={hint} error={error}>
      <select
        id={name}
        name={name}
        className={BOX}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ name, hint, error })}
        {...rest}
      />
    </FieldFrame>
  )
}
