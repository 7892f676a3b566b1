'use client'
// Name, units and clock.
import { ActionForm } from '@/components/ui/action-form'
import { SelectField, TextField } from '@/components/ui/field'
import type { AccountView } from '@/lib/services/own-account'
import type { UnitName } from '@/lib/units'
import { saveAccountAction } from '../actions'

/** Each with what is read and typed in it. */
const UNIT_FIELDS: readonly { name: UnitName; label: string; choices: readonly (readonly [string, string])[] }[] = [
  {
    name: 'temperature',
    label: 'Temperature',
    choices: [
      ['C', '°C'],
      ['F', '°F'],
    ],
  },
  {
    name: 'ice',
    label: 'Ice, snow, rain and depths',
    choices: [
      ['cm', 'Centimetres and millimetres'],
      ['in', 'Inches'],
    ],
  },
  {
    name: 'water',
    label: 'Water',
    choices: [
      ['L', 'Litres'],
      ['gal', 'US gallons'],
    ],
  },
  {
    name: 'size',
    label: 'Size of the yard',
    choices: [
      ['m', 'Metres'],
      ['ft', 'Feet'],
    ],
  },
  {
    name: 'wind',
    label: 'Wind',
    choices: [
      ['km/h', 'Kilometres an hour'],
      ['m/s', 'Metres a second'],
      ['mph', 'Miles an hour'],
    ],
  },
]

export function AccountForm({ name, units, clock, theme }: Pick<AccountView, 'name' | 'units' | 'clock' | 'theme'>) {
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
          {UNIT_FIELDS.map(({ name: unit, label, choices }) => (
            // React resets a select to the choice it was first drawn with; the key draws it anew.
            <SelectField
              key={`${unit} ${values?.[unit]}`}
              label={label}
              name={unit}
              defaultValue={values?.[unit] ?? units[unit]}
              error={fields?.[unit]}
            >
              {choices.map(([value, words]) => (
                <option key={value} value={value}>
                  {words}
                </option>
              ))}
            </SelectField>
          ))}
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
          <SelectField
            key={`theme ${values?.theme}`}
            label="Look"
            name="theme"
            hint="After sunset is told by the sky over your rink."
            defaultValue={values?.theme ?? theme}
            error={fields?.theme}
          >
            <option value="system">As this device has it</option>
            <option value="light">Light</option>
            <option value="dark">Dark</option>
            <option value="dark-after-sunset">Dark after sunset at the rink</option>
          </SelectField>
        </>
      )}
    </ActionForm>
  )
}
