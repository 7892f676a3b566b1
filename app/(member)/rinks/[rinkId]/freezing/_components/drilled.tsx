// The newest drilled hole, the form for another, and the keeper's word that the rink is open.
import type { Route } from 'next'
import Link from 'next/link'
import { Facts } from '@/components/ui/facts'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { typed, unitOf } from '@/lib/schemas/measures'
import { iceText } from '@/lib/words/quantities'
import { clockText, weekdayText } from '@/lib/words/times'
import { OpenRink, ReadingForm } from './ice-forms'

export function Drilled({ view, entryKey }: { view: FreezingView; entryKey: string }) {
  const { rink, reader, reading, mayWrite, mayManage, isDrilledThick } = view
  return (
    <>
      <NewestHole view={view} />
      {mayWrite ? <ReadingForm rinkId={rink.id} units={reader.units} entryKey={entryKey} /> : null}
      {mayManage && isDrilledThick ? <OpenRink rinkId={rink.id} /> : null}
      {mayManage && reading && !isDrilledThick ? (
        <p className="mt-4 max-w-line text-note text-graphite">
          The rink is opened here once a hole is {typed('carriesSkater', reader.units, rink.carriesSkaterMm)}{' '}
          {unitOf('carriesSkater', reader.units)} thick, your limit. Where all the water has frozen to the floor with
          less, say so in its{' '}
          <Link href={`/rinks/${rink.id}/settings/ice` as Route} className="underline">
            settings
          </Link>
          .
        </p>
      ) : null}
    </>
  )
}

function NewestHole({ view: { reading, reader } }: { view: FreezingView }) {
  if (!reading) {
    return (
      <section className="mt-8">
        <h2 className="mb-2 font-semibold">Drilled</h2>
        <p className="max-w-line border-t border-rule pt-3 text-graphite">
          Nobody has drilled since the fill, or not for three days. A hole near the edge, where you can stand beside the
          ice, corrects everything on this page.
        </p>
      </section>
    )
  }
  const at = `${weekdayText(reading.at, reader)} ${clockText(reading.at, reader)}`
  return (
    <section className="mt-8">
      <h2 className="mb-2 font-semibold">Drilled</h2>
      <div className="border-t border-rule">
        <Facts
          rows={[
            { name: `${at}${reading.by ? `, by ${reading.by}` : ''}`, figure: iceText(reading.thicknessMm, reader) },
          ]}
        />
      </div>
      <p className="mt-2 text-small text-graphite">The estimate starts from the newest hole.</p>
    </section>
  )
}
