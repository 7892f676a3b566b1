// The ground: sides, and how it lies below a level string, by four corners or by a grid of points.
'use client'
import { Button } from '@/components/ui/button'
import { SelectField, TextField } from '@/components/ui/field'
import { CORNER_NAMES } from '@/components/rinks/corner-names'
import { CORNER_FIELDS } from '@/lib/schemas/floor'
import { unitOf } from '@/lib/schemas/measures'
import type { Units } from '@/lib/units'
import { BY_ADDRESS } from './by-address'
import { PointGrid } from './point-grid'
import type { PlanForm } from './use-plan-form'

export function GroundFields({ form, units }: { form: PlanForm; units: Units }) {
  const { isHydrated } = form
  const kind = form.values.floorKind
  return (
    <>
      <div className="grid grid-cols-2 gap-x-4">
        <TextField label="Length" inputMode="decimal" unit={unitOf('side', units)} {...form.field('length')} />
        <TextField label="Width" inputMode="decimal" unit={unitOf('side', units)} {...form.field('width')} />
      </div>
      <SelectField
        label="How does the ground lie?"
        hint="Stretch a string level from the highest point and measure down to the ground."
        {...form.field('floorKind')}
      >
        <option value="level">Level, or not measured</option>
        <option value="corners">Four corners</option>
        <option value="grid">A grid of points</option>
      </SelectField>
      <div hidden={kind !== 'corners'}>
        <div className="grid grid-cols-2 gap-x-4">
          {CORNER_FIELDS.map((name, corner) => (
            <TextField
              key={name}
              label={CORNER_NAMES[corner] ?? ''}
              inputMode="decimal"
              unit={unitOf('drop', units)}
              {...form.field(name)}
            />
          ))}
        </div>
        <p className="-mt-2 mb-5 text-note text-graphite">
          Below the string. Length runs from the north and east corners to the west and south ones.
        </p>
      </div>
      {kind === 'grid' ? <PointGrid form={form} units={units} /> : null}
      {isHydrated ? null : (
        <Button type="submit" className="mb-5" {...BY_ADDRESS}>
          Show the fields for this ground
        </Button>
      )}
    </>
  )
}
