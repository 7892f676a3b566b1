// Changing an entry. When somebody else was faster, both versions are in sight before one overwrites the other.
'use client'
import { useFirstFault } from '@/components/hooks/use-first-fault'
import { useSend } from '@/components/hooks/use-send'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { LogKind } from '@/lib/schemas/log-choices'
import { unitsCode, type Units } from '@/lib/units'
import { changeEntryAction } from '../../actions'
import { MainFields, Note, Water } from '../../_components/entry-fields'
import type { EntryValues } from '../../_components/entry-values'
import { DayAndTime } from '../../_components/when-fields'

interface ChangeFormProps {
  rinkId: string
  entryId: string
  kind: LogKind
  version: number
  units: Units
  initial: EntryValues
}

export function ChangeForm({ rinkId, entryId, kind, version, units, initial }: ChangeFormProps) {
  const { state, post, submit, isSending } = useSend(changeEntryAction)
  const form = useFirstFault(state, isSending)
  const isError = state.status === 'error'
  const values = (isError && state.values) || initial
  const faults = state.fields ?? {}
  const fields = { kind, units, values, faults }
  const isNoteInMain = kind === 'repair' || kind === 'note'
  const isOvertaken = isError && state.latest?.version !== undefined
  return (
    // What was typed stays while the page reads itself anew under the form; a saved change starts it afresh.
    <form
      key={isError ? 'typed' : version}
      ref={form}
      action={post}
      onSubmit={(event) => submit(event)}
      noValidate
      className="max-w-[34rem]"
    >
      {state.message ? (
        <Notice live tone={isError ? 'caution' : 'plain'}>
          <p>{state.message}</p>
          {isOvertaken ? (
            <p>What you typed is still below. Saving it now replaces theirs; theirs stays in the history.</p>
          ) : null}
        </Notice>
      ) : null}
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="entryId" value={entryId} />
      <input type="hidden" name="kind" value={kind} />
      <input type="hidden" name="units" value={unitsCode(units)} />
      <input
        type="hidden"
        name="version"
        value={(isError && (state.latest?.version ?? state.values?.version)) || version}
      />
      <MainFields {...fields} />
      <DayAndTime values={values} faults={faults} isNew={false} />
      {kind === 'flood' || kind === 'fill' ? <Water {...fields} /> : null}
      {isNoteInMain ? null : <Note {...fields} />}
      <Button type="submit" look="main" disabled={isSending}>
        {isSending ? 'Saving' : isOvertaken ? 'Replace theirs with mine' : 'Save'}
      </Button>
    </form>
  )
}
