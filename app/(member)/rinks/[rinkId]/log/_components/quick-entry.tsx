// Writing an entry with gloves on: choose what was done, then one button. The line shows at once and goes back if it fails.
'use client'
import { useState, type MouseEvent } from 'react'
import { useEntryKey } from '@/components/hooks/use-entry-key'
import { useFirstFault } from '@/components/hooks/use-first-fault'
import { useSend } from '@/components/hooks/use-send'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { FormState } from '@/lib/http/form-state'
import { LOG_KINDS, type LogKind } from '@/lib/schemas/log-choices'
import type { LogFrame } from '@/lib/services/log-book'
import { unitsCode } from '@/lib/units'
import { KIND_WORDS } from '@/lib/words/log'
import { writeEntryAction } from '../actions'
import { MainFields, MoreFields } from './entry-fields'
import { newValues, type EntryValues } from './entry-values'
import { AgoFields, AnotherTime } from './when-fields'

/** As the buttons stand: what is done most comes first. */
const ORDER = [
  'flood',
  'scrape',
  'clear',
  'reading',
  'repair',
  'note',
  'fill',
  'thaw',
] as const satisfies readonly LogKind[]

type QuickEntryProps = Pick<LogFrame, 'usual' | 'reader'> & {
  rinkId: string
  /** New with each page: the same entry sent twice is kept once. */
  entryKey: string
  /** Named in the address: how it opens without script. */
  open: LogKind | null
}

export function QuickEntry({ open, ...rest }: QuickEntryProps) {
  const [kind, setKind] = useState(open)
  const [news, setNews] = useState<string>()
  const choose = (event: MouseEvent<HTMLButtonElement>, chosen: LogKind) => {
    event.preventDefault()
    setKind(chosen === kind ? null : chosen)
    setNews(undefined)
  }
  return (
    <section aria-label="Write into the log" className="print:hidden">
      <form method="get" className="mt-5 mb-2 grid grid-cols-4 gap-2.5 lg:grid-cols-8">
        {ORDER.map((choice) => (
          <Button
            key={choice}
            type="submit"
            name="write"
            value={choice}
            look={choice === 'flood' ? 'main' : 'plain'}
            aria-expanded={choice === kind}
            className="min-h-16 px-1! leading-tight"
            onClick={(event) => choose(event, choice)}
          >
            {KIND_WORDS[choice]}
          </Button>
        ))}
      </form>
      {news ? <Notice live>{news}</Notice> : null}
      <EntryForm
        key={kind ?? ''}
        {...rest}
        kind={kind}
        onSaved={({ message }) => {
          setKind(null)
          setNews(message)
        }}
      />
    </section>
  )
}

const SUBMITS: Record<LogKind, string> = {
  flood: 'Log this flood',
  fill: 'Log this fill',
  scrape: 'Log this scrape',
  clear: 'Log the clearing',
  repair: 'Log this repair',
  reading: 'Log this reading',
  thaw: 'Log this thaw',
  note: 'Log this note',
}

interface EntryFormProps extends Omit<QuickEntryProps, 'open'> {
  kind: LogKind | null
  onSaved: (saved: FormState) => void
}

function EntryForm({ kind, onSaved, usual, reader, rinkId, entryKey }: EntryFormProps) {
  const { state, post, submit, isSending } = useSend(writeEntryAction)
  const form = useFirstFault(state, isSending)
  const key = useEntryKey(state, entryKey)
  const shown = kind ?? sentKind(state.status === 'error' ? state.values : undefined)
  if (shown === null) {
    return state.message ? (
      <Notice live tone={state.status === 'error' ? 'caution' : 'plain'}>
        {state.message}
      </Notice>
    ) : null
  }
  const values: EntryValues = (state.status === 'error' && state.values) || newValues(shown, { usual, reader })
  const faults = state.fields ?? {}
  const fields = { kind: shown, units: reader.units, values, faults }
  return (
    <>
      {isSending ? (
        <p role="status" className="border-y border-rule py-3">
          <b className="font-semibold">{KIND_WORDS[shown]}</b>, just now{' '}
          <span className="text-graphite">being written down</span>
        </p>
      ) : null}
      {state.message && !isSending ? (
        <Notice live tone={state.status === 'error' ? 'caution' : 'plain'}>
          {state.message}
        </Notice>
      ) : null}
      <form
        ref={form}
        action={post}
        onSubmit={(event) => submit(event, onSaved)}
        noValidate
        hidden={isSending}
        aria-label={`${KIND_WORDS[shown]}: a new entry`}
        className="mt-4 max-w-[34rem]"
      >
        <input type="hidden" name="rinkId" value={rinkId} />
        <input type="hidden" name="entryKey" value={key} />
        <input type="hidden" name="kind" value={shown} />
        <input type="hidden" name="units" value={unitsCode(reader.units)} />
        <MainFields {...fields} />
        <AgoFields values={values} faults={faults} />
        <Button type="submit" look="main" disabled={isSending} className="min-h-16 w-full sm:w-auto sm:px-10!">
          {SUBMITS[shown]}
        </Button>
        <div className="mt-2">
          <MoreFields {...fields} />
          <AnotherTime values={values} faults={faults} />
        </div>
      </form>
    </>
  )
}

function sentKind(values: EntryValues | undefined): LogKind | null {
  return LOG_KINDS.find((kind) => kind === values?.kind) ?? null
}
