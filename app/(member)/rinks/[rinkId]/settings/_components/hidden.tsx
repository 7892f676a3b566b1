// What a form sends along without showing it.
import type { RinkForm } from '@/components/rinks/form/use-rink-form'

export function Hidden({ form, names }: { form: RinkForm; names: readonly string[] }) {
  return names.map((name) => <input key={name} type="hidden" name={name} value={form.values[name] ?? ''} />)
}
