// How thick a drilled hole was, and the keeper's word that the rink is open.
'use client'
import { useEntryKey } from '@/components/hooks/use-entry-key'
import { ActionForm } from '@/components/ui/action-form'
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import type { FormState } from '@/lib/http/form-state'
import { unitOf } from '@/lib/schemas/measures'
import { unitsCode, type Units } from '@/lib/units'
import { READING_HINT } from '@/lib/words/log'
import { openForSkatingAction, writeReadingAction } from '../actions'

export function ReadingForm({ rinkId, units, entryKey }: { rinkId: string; units: Units; entryKey: string }) {
  return (
    <section className="mt-6">
      <ActionForm action={writeReadingAction} submit="Log this hole" look="plain">
        {(state) => (
          <>
            <EntryKey state={state} offered={entryKey} />
            <input type="hidden" name="rinkId" value={rinkId} />
            <input type="hidden" name="units" value={unitsCode(units)} />
            <input type="hidden" name="kind" value="reading" />
            <input type="hidden" name="minutesAgo" value="0" />
            <TextField
              label="Ice in a hole drilled now"
              name="thickness"
              inputMode="decimal"
              unit={unitOf('iceThickness', units)}
              hint={`${READING_HINT} Reach from outside the boards while it is thin.`}
              defaultValue={state.status === 'error' ? (state.values?.thickness ?? '') : ''}
              error={state.fields?.thickness}
            />
          </>
        )}
      </ActionForm>
    </section>
  )
}

function EntryKey({ state, offered }: { state: FormState; offered: string }) {
  return <input type="hidden" name="entryKey" value={useEntryKey(state, offered)} />
}

export function OpenRink({ rinkId }: { rinkId: string }) {
  return (
    <section className="mt-6 border-t border-rule pt-2">
      <Disclosure summary="Open for skating">
        <p className="mb-3 max-w-line text-note text-graphite">
          You have drilled, and the hole was as thick as you want it. Thickness between holes stays an estimate; you
          decide. Skaters then see the rink as open, and the nights turn to flooding.
        </p>
        <ActionForm action={openForSkatingAction} submit="Open the rink">
          {() => <input type="hidden" name="rinkId" value={rinkId} />}
        </ActionForm>
      </Disclosure>
    </section>
  )
}
