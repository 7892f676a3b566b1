// One night in a row: day, verdict in a word, bars, what to do or why not, what it brings, how many runs agree.
import Link from 'next/link'
import type { Route } from 'next'
import { dayText, shortDayText } from '@/components/rinks/reader'
import type { WeekNight } from '@/lib/schemas/week-view'
import type { WordOptions } from '@/lib/words/options'
import { layerText } from '@/lib/words/quantities'
import {
  iceChangeParts,
  iceChangeText,
  nightAgreement,
  nightFacts,
  nightWhat,
  NIGHT_WORDS,
} from '@/lib/words/week-night'
import type { BarScale } from './bar-scale'
import { NightBars } from './night-bars'

const TONES: Record<WeekNight['verdict'], string> = {
  flood: 'font-semibold text-lamp-text',
  fill: 'font-semibold text-hose',
  thaw: 'text-rust',
  hold: 'text-ink',
  unknown: 'text-graphite',
}

interface NightRowProps {
  rinkId: string
  night: WeekNight
  scale: BarScale
  isOpen: boolean
  reader: WordOptions
}

export function NightRow({ rinkId, night, scale, isOpen, reader }: NightRowProps) {
  const facts = nightFacts(night, reader)
  return (
    <div className="relative grid grid-cols-[64px_1fr_auto] items-baseline gap-x-3 gap-y-1 px-5 py-3 lg:grid-cols-[72px_92px_300px_1fr_92px_84px] lg:items-center lg:gap-x-5 lg:py-2">
      <NightLink rinkId={rinkId} nightDate={night.nightDate} isOpen={isOpen} />
      <span className={`col-start-2 row-start-1 font-medium ${TONES[night.verdict]}`}>
        {NIGHT_WORDS[night.verdict]}
      </span>
      <NightBars
        night={night}
        scale={scale}
        className={`col-span-3 col-start-1 row-start-2 h-auto w-full lg:col-span-1 lg:col-start-3 lg:row-start-1 ${night.isFar ? 'opacity-55' : ''}`}
      />
      <p className="col-span-2 col-start-1 row-start-3 text-note lg:col-span-1 lg:col-start-4 lg:row-start-1">
        <span className={night.isFar ? 'text-graphite' : ''}>{nightWhat(night, reader)}</span>
        {facts.length > 0 ? <span className="block text-small text-graphite">{facts.join('; ')}</span> : null}
      </p>
      <Brings night={night} reader={reader} />
      <span className="col-start-3 row-start-3 text-right text-small text-graphite lg:col-start-6 lg:row-start-1">
        {nightAgreement(night) ?? 'not compared'}
      </span>
    </div>
  )
}

/** The day opens the night; its target is the whole row. */
function NightLink({ rinkId, nightDate, isOpen }: { rinkId: string; nightDate: string; isOpen: boolean }) {
  const week = `/rinks/${rinkId}/week`
  return (
    <Link
      href={(isOpen ? week : `${week}?night=${nightDate}#night-${nightDate}`) as Route}
      prefetch={false}
      scroll={!isOpen}
      aria-expanded={isOpen}
      className="col-start-1 row-start-1 font-semibold whitespace-nowrap underline after:absolute after:inset-0 after:content-['']"
    >
      <span aria-hidden="true">{shortDayText(nightDate)}</span>
      <span className="sr-only">Hours of {dayText(nightDate)}</span>
    </Link>
  )
}

function Brings({ night, reader }: { night: WeekNight; reader: WordOptions }) {
  const change = iceChangeText(night, reader)
  const parts = iceChangeParts(night, reader)
  const place = 'col-start-3 row-start-1 text-right lg:col-start-5 lg:row-start-1'
  if (change === null) {
    return night.freezableMm === null ? null : (
      <span className={place}>
        <span className="font-medium">{layerText(Math.round(night.freezableMm), reader)}</span>{' '}
        <span className="text-small text-graphite lg:block">could freeze</span>
      </span>
    )
  }
  return (
    <span className={place}>
      <span className="sr-only">Ice: </span>
      <span className="font-medium">{change}</span>
      {parts ? <span className="sr-only"> ({parts})</span> : null}
    </span>
  )
}
