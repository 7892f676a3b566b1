// Fields for who somebody is: the address and the password, with the names that password managers know.
import { MIN_PASSWORD_LENGTH } from '@/lib/schemas/password-length'
import type { FormState } from '@/lib/http/form-state'
import { TextField } from './field'

type Known = Pick<FormState, 'fields' | 'values'>

export function EmailField({
  fields,
  values,
  label = 'E-mail',
  autoComplete = 'username',
}: Known & { label?: string; autoComplete?: string }) {
  return (
    <TextField
      label={label}
      name="email"
      type="email"
      autoComplete={autoComplete}
      defaultValue={values?.email}
      error={fields?.email}
    />
  )
}

export function PasswordField({
  fields,
  name = 'password',
  label = 'Password',
}: Known & { name?: string; label?: string }) {
  return <TextField label={label} name={name} type="password" autoComplete="current-password" error={fields?.[name]} />
}

export function NewPasswordField({
  fields,
  name = 'password',
  label = 'New password',
  note,
}: Known & { name?: string; label?: string; note: string }) {
  return (
    <TextField
      label={label}
      name={name}
      type="password"
      hint={`At least ${MIN_PASSWORD_LENGTH} characters. ${note}`}
      autoComplete="new-password"
      error={fields?.[name]}
    />
  )
}

/** Password managers file a new password under this name. */
export function FiledUnder({ email }: { email: string }) {
  return <input type="email" autoComplete="username" value={email} readOnly hidden />
}
