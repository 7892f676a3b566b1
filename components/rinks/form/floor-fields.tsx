// The floor and the boards: how far the ground lies below its highest point.
import { ChoiceField } from '@/components/ui/choice-field'
import { AreaField, TextField } from '@/components/ui/field'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { unitOf } from '@/lib/schemas/measures'
import type { RinkForm } from './use-rink-form'

const FLOOR_CHOICES = [
  { value: 'level', label: 'Level, or not measured', note: 'The same depth of water everywhere.' },
  { value: 'corners', label: 'Four corners', note: 'Depth of each corner below a level string.' },
  { value: 'grid', label: 'A grid of points', note: 'For ground with a hollow or a ridge in it.' },
]

const CORNERS = [
  { name: 'cornerNorth', label: 'North corner' },
  { name: 'cornerEast', label: 'East corner' },
  { name: 'cornerSouth', label: 'South corner' },
  { name: 'cornerWest', label: 'West corner' },
]

export function FloorFields({ form }: { form: RinkForm }) {
  const isHydrated = useHydrated()
  const kind = form.values.floorKind
  return (
    <>
      <ChoiceField
        legend="How does the ground lie?"
        hint="Stretch a string level from the highest point and measure down to the ground."
        choices={FLOOR_CHOICES}
        {...form.choice('floorKind')}
      />
      <div hidden={isHydrated && kind !== 'corners'}>
        <p className="mb-2 text-note text-graphite">
          Below the string. Length runs from the north and east corners to the west and south ones.
        </p>
        <div className="grid grid-cols-2 gap-x-4">
          {CORNERS.map(({ name, label }) => (
            <TextField key={name} label={label} inputMode="decimal" {...form.text(name)} />
          ))}
        </div>
      </div>
      <div hidden={isHydrated && kind !== 'grid'}>
        <AreaField
          label={`Points, ${unitOf('drop', form.units)} below the string`}
          hint="A line for each row along the length, spaces between points across the width. First and last points lie at the boards."
          rows={5}
          {...form.area('grid')}
        />
      </div>
      <TextField
        label="Height of the boards"
        inputMode="decimal"
        hint="If you leave it empty, the plan says how high they have to be."
        {...form.text('boardHeight')}
      />
    </>
  )
}
