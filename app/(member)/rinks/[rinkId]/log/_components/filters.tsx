// Which entries are listed: by kind, by person, by nights. A plain form whose address can be kept.
import type { Route } from 'next'
import Link from 'next/link'
import { Button } from '@/components/ui/button'
import { Disclosure } from '@/components/ui/disclosure'
import { SelectField, TextField } from '@/components/ui/field'
import { LOG_KINDS } from '@/lib/schemas/log-choices'
import type { LogQuery } from '@/lib/schemas/log-query'
import { KIND_WORDS } from '@/lib/words/log'

interface FiltersProps {
  rinkId: string
  query: LogQuery
  writers: { id: string; name: string }[]
}

export function isFiltered({ kind, person, from, to }: LogQuery): boolean {
  return [kind, person, from, to].some((value) => value !== undefined)
}

/** The address of the log with these filters. */
export function logAddress(rinkId: string, { kind, person, from, to, before }: LogQuery): Route {
  const given = Object.entries({ kind, person, from, to, before }).filter(
    (entry): entry is [string, string] => entry[1] !== undefined,
  )
  const query = new URLSearchParams(given).toString()
  return `/rinks/${rinkId}/log${query ? `?${query}` : ''}` as Route
}

export function Filters({ rinkId, query, writers }: FiltersProps) {
  const isSwapped = query.from !== undefined && query.to !== undefined && query.from > query.to
  return (
    <Disclosure summary="Filter" open={isFiltered(query)} className="print:hidden">
      <form method="get" action={`/rinks/${rinkId}/log`} className="grid gap-x-4 sm:grid-cols-2">
        <SelectField label="What was done" name="kind" defaultValue={query.kind ?? ''}>
          <option value="">Everything</option>
          {LOG_KINDS.map((kind) => (
            <option key={kind} value={kind}>
              {KIND_WORDS[kind]}
            </option>
          ))}
        </SelectField>
        <SelectField label="By whom" name="person" defaultValue={query.person ?? ''}>
          <option value="">Everybody</option>
          {writers.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </SelectField>
        <TextField label="From the night of" name="from" type="date" defaultValue={query.from ?? ''} />
        <TextField
          label="To the night of"
          name="to"
          type="date"
          defaultValue={query.to ?? ''}
          error={isSwapped ? 'This is before the first night.' : undefined}
        />
        <div className="flex flex-wrap gap-3 sm:col-span-2">
          <Button type="submit">Show these</Button>
          {isFiltered(query) ? (
            <Link
              href={logAddress(rinkId, {})}
              className="inline-flex min-h-touch items-center px-3 text-ink underline"
            >
              Show everything
            </Link>
          ) : null}
        </div>
      </form>
    </Disclosure>
  )
}
