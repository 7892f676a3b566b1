// How the keeper wants to be told. The browser is not asked for permission here: that takes a tap of its own, afterwards.
import type { RinkForm } from '@/components/rinks/form/use-rink-form'
import { TickField } from '@/components/ui/choice-field'
import { TextField } from '@/components/ui/field'

export function ToldFields({ form, email }: { form: RinkForm; email: string }) {
  return (
    <>
      <TextField
        label="Tell me at"
        type="time"
        hint="Once on a day with a good night ahead, early enough to get ready. Nothing on other days."
        {...form.text('tellAt')}
      />
      <fieldset className="mb-6">
        <legend className="font-medium">How?</legend>
        <TickField label="Notification on this device" note="The next page asks for it." {...form.tick('wantsPush')} />
        <TickField label="E-mail" note={`To ${email}`} {...form.tick('wantsEmail')} />
      </fieldset>
    </>
  )
}
