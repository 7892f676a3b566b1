// A night opened: its strip and the same hours as a table.
import Link from 'next/link'
import type { Route } from 'next'
import { layOutNightStrip, type StripFrame, type StripInput } from '@/components/charts/night-strip-layout'
import { NightStripDrawing } from '@/components/charts/night-strip-drawing'
import { hourNames } from '@/components/rinks/hour-names'
import { NightTable } from '@/components/rinks/night-table'
import { stripHours } from '@/components/rinks/strip-input'
import { stripWords } from '@/components/rinks/strip-words'
import { addDays, instantOfLocal } from '@/lib/advice/zoned-time'
import type { ScoredHour } from '@/lib/advice/types'
import type { WeekNight, WeekView } from '@/lib/schemas/week-view'
import { nightLabel } from '@/lib/words/night-label'
import type { WordOptions } from '@/lib/words/options'

const WIDE: StripFrame = { width: 800, height: 274, left: 38, right: 44, plotTop: 34, plotBottom: 214 }
const NARROW: StripFrame = { width: 390, height: 268, left: 38, right: 40, plotTop: 34, plotBottom: 208 }
/** A phone shows the hours in which floods happen: 3 pm to 9 am. */
const NARROW_MINUTES = { from: 15 * 60, to: 9 * 60 }

interface OpenNightProps {
  night: WeekNight
  hours: ScoredHour[]
  view: WeekView
  reader: WordOptions
}

export function OpenNight({ night, hours, view, reader }: OpenNightProps) {
  const drawn = stripHours(hours, reader.units)
  const millisOf = (at: string | null) => (at === null ? null : Date.parse(at))
  const now = Date.parse(view.readAt)
  const whole: StripInput = {
    frame: WIDE,
    startsAt: Date.parse(night.startsAt),
    endsAt: Date.parse(night.endsAt),
    hours: drawn,
    passes: [],
    sunsetAt: millisOf(night.sunsetAt),
    sunriseAt: millisOf(night.sunriseAt),
    now: now >= Date.parse(night.startsAt) ? now : null,
    leastRateTop: reader.units.ice === 'in' ? 0.04 : 1,
  }
  const evening: StripInput = {
    ...whole,
    frame: NARROW,
    startsAt: instantOfLocal(night.nightDate, NARROW_MINUTES.from, reader.timeZone),
    endsAt: instantOfLocal(addDays(night.nightDate, 1), NARROW_MINUTES.to, reader.timeZone),
  }
  return (
    <section aria-label={nightLabel(night.nightDate)} className="border-t border-rule pt-3">
      <div className="hidden min-[720px]:block">
        <NightStripDrawing id="night-wide" layout={layOutNightStrip(whole)} words={stripWords(whole, hours, reader)} />
      </div>
      <div className="min-[720px]:hidden">
        <NightStripDrawing
          id="night-narrow"
          layout={layOutNightStrip(evening)}
          words={stripWords(evening, hours, reader)}
        />
      </div>
      <div className="px-5">
        <p className="text-small text-graphite">
          Bars: water frozen in an hour, left scale; line: air temperature, right scale. {nightLabel(night.nightDate)}.
        </p>
        <NightTable hours={hours} names={hourNames(hours, reader)} drawn={drawn} reader={reader} />
        {now >= Date.parse(night.startsAt) ? (
          <p className="text-note">
            <Link href={`/rinks/${view.rink.id}` as Route} className="inline-flex min-h-touch items-center underline">
              The plan of this night
            </Link>
          </p>
        ) : null}
      </div>
    </section>
  )
}
