// What can be done at an open fill: hose off and on, a look, the end.
'use client'
import { CORNER_NAMES } from '@/components/rinks/corner-names'
import { ActionForm } from '@/components/ui/action-form'
import { Disclosure } from '@/components/ui/disclosure'
import { AreaField, TextField } from '@/components/ui/field'
import { typed, unitOf } from '@/lib/schemas/measures'
import { unitsCode, type Units } from '@/lib/units'
import { checkFillAction, finishFillAction, giveUpFillAction, pauseFillAction, resumeFillAction } from '../actions'

interface Props {
  rinkId: string
  units: Units
}

function Hidden({ rinkId, units }: Props) {
  return (
    <>
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="units" value={unitsCode(units)} />
    </>
  )
}

export function HoseForm({ isRunning, flowLPerMin, ...form }: Props & { isRunning: boolean; flowLPerMin: number }) {
  if (isRunning) {
    return (
      <section className="mt-6">
        <ActionForm action={pauseFillAction} submit="Hose off: pause" look="plain">
          {() => <Hidden {...form} />}
        </ActionForm>
      </section>
    )
  }
  return (
    <section className="mt-6">
      <h2 className="mb-3 font-semibold">Go on</h2>
      <ActionForm action={resumeFillAction} submit="The hose runs: go on">
        {({ values, fields }) => (
          <>
            <Hidden {...form} />
            <TextField
              label="Flow"
              name="flow"
              inputMode="decimal"
              unit={unitOf('flow', form.units)}
              defaultValue={values?.flow ?? typed('flow', form.units, flowLPerMin)}
              error={fields?.flow}
            />
          </>
        )}
      </ActionForm>
    </section>
  )
}

export function CheckForm({ lowCorner, isFirst, ...form }: Props & { lowCorner: number; isFirst: boolean }) {
  return (
    <section className="mt-8">
      <h2 className="mb-3 font-semibold">Log a look</h2>
      <ActionForm action={checkFillAction} submit="Log this look" look={isFirst ? 'main' : 'plain'}>
        {({ status, values, fields }) => {
          const kept = status === 'error' ? values : undefined
          return (
            <>
              <Hidden {...form} />
              <TextField
                label={`Water at the lowest corner (${(CORNER_NAMES[lowCorner] ?? '').toLowerCase()})`}
                name="lowCornerDepth"
                inputMode="decimal"
                unit={unitOf('lowCornerDepth', form.units)}
                hint="On a stick down to the liner. Empty if you only looked."
                defaultValue={kept?.lowCornerDepth ?? ''}
                error={fields?.lowCornerDepth}
              />
              <AreaField
                label="What you saw"
                name="note"
                rows={2}
                defaultValue={kept?.note ?? ''}
                error={fields?.note}
              />
            </>
          )
        }}
      </ActionForm>
    </section>
  )
}

/** @param missing How much of the fill is not in yet, in words; empty when nothing to speak of. */
export function FinishForms({ rinkId, missing }: { rinkId: string; missing: string }) {
  const hidden = () => <input type="hidden" name="rinkId" value={rinkId} />
  return (
    <section className="mt-8 border-t border-rule pt-2">
      <Disclosure summary="The water is in: finish">
        <p className="mb-3 max-w-line text-note text-graphite">
          Turns the reckoning of the hose off, writes the fill into the log and follows the freezing from here on. The
          rink is closed until you open it.
        </p>
        {missing ? (
          <p className="mb-3 max-w-line border-l-[3px] border-rust pl-3.5 text-note">
            {missing} of the fill are not in yet. To go on another day, pause instead.
          </p>
        ) : null}
        <ActionForm action={finishFillAction} submit="Finish the fill">
          {hidden}
        </ActionForm>
      </Disclosure>
      <Disclosure summary="It came to nothing: give up">
        <p className="mb-3 max-w-line text-note text-graphite">
          A torn liner, boards that gave way, no cold after all. The water is logged, and the rink waits again.
        </p>
        <ActionForm action={giveUpFillAction} submit="Give this fill up" look="plain">
          {hidden}
        </ActionForm>
      </Disclosure>
    </section>
  )
}
