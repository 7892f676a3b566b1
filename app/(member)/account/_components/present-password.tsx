// The present password, asked for once more before something that cannot be undone alone.
import { TextField } from '@/components/ui/field'

/** @param id Its own: a page may ask twice. */
export function PresentPassword({ id, error }: { id: string; error?: string }) {
  return (
    <TextField
      label="Your password"
      name="currentPassword"
      fieldId={id}
      type="password"
      autoComplete="current-password"
      error={error}
    />
  )
}
