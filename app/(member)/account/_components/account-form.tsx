'use client'
// Name, units and clock.
import { ActionForm } from '@/components/ui/action-form'
import { SelectField, TextField } from '@/components/ui/field'
import type { AccountView } from '@/lib/services/own-account'
import { saveAccountAction } from '../actions'

export function AccountForm({ name, units, clock }: Pick<AccountView, 'name' | 'units' | 'clock'>) {
  return (
    <ActionForm action={saveAccountAction} submit="Save">
      {({ fields, values }) => (
        <>
          <TextField
            label="Name"
            name="name"
            hint="As your crew knows you."
            autoComplete="name"
            defaultValue={values?.name ?? name}
            error={fields?.name}
          />
          {/* React resets a select to the choice it was first drawn with; the key draws it anew. */}
          <SelectField
            key={`units ${values?.units}`}
            label="Units"
            name="units"
            defaultValue={values?.units ?? units}
            error={fields?.units}
          >
            <option value="metric">Metric: °C, mm, litres</option>
            <option value="imperial">Imperial: °F, inches, gallons</option>
          </SelectField>
          <SelectField
            key={`clock ${values?.clock}`}
            label="Clock"
            name="clock"
            defaultValue={values?.clock ?? clock}
            error={fields?.clock}
          >
            <option value="12">8:30 pm</option>
            <option value="24">20:30</option>
          </SelectField>
        </>
      )}
    </ActionForm>
  )
}
