// The form that starts a fill, with the rink's own depth and flow in it.
'use client'
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { typed, unitOf } from '@/lib/schemas/measures'
import type { FillingView } from '@/lib/schemas/filling-view'
import { unitsCode, type Units } from '@/lib/units'
import { startFillAction } from '../actions'

interface Props {
  rinkId: string
  usual: FillingView['usual']
  units: Units
}

export function StartFill({ rinkId, usual, units }: Props) {
  return (
    <section className="mt-8">
      <h2 className="mb-3 font-semibold">Start the fill</h2>
      <ActionForm action={startFillAction} submit="The hose runs: start">
        {({ values, fields }) => (
          <>
            <input type="hidden" name="rinkId" value={rinkId} />
            <input type="hidden" name="units" value={unitsCode(units)} />
            <TextField
              label="Mean depth of water wanted"
              name="fillDepth"
              inputMode="decimal"
              unit={unitOf('fillDepth', units)}
              defaultValue={values?.fillDepth ?? typed('fillDepth', units, usual.fillDepthMm)}
              error={fields?.fillDepth}
            />
            <TextField
              label="Flow"
              name="flow"
              inputMode="decimal"
              unit={unitOf('flow', units)}
              hint="By the bucket, with the hose at its full length. All hoses together."
              defaultValue={values?.flow ?? typed('flow', units, usual.flowLPerMin)}
              error={fields?.flow}
            />
          </>
        )}
      </ActionForm>
    </section>
  )
}
