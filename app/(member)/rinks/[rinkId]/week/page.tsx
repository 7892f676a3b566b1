// The nights ahead at a glance; a night's link opens its hours in place. All of it is drawn on the server.
import type { Metadata } from 'next'
import { DataSource } from '@/components/rinks/data-source'
import { ForecastNotice } from '@/components/rinks/forecast-notice'
import { readerOf } from '@/components/rinks/reader'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { dateSchema } from '@/lib/schemas/local-time'
import type { WeekView } from '@/lib/schemas/week-view'
import { getWeek } from '@/lib/services/week'
import { OFF_SEASON } from '../_components/off-season'
import { FillAhead } from './_components/fill-ahead'
import { NightList } from './_components/night-list'
import { WeekHeadline } from './_components/week-headline'
import { WithoutNights } from './_components/without-nights'

export const metadata: Metadata = { title: 'The nights ahead' }

export default async function WeekPage({ params, searchParams }: PageProps<'/rinks/[rinkId]/week'>) {
  const [{ rinkId }, { night }] = await Promise.all([params, searchParams])
  const openDate = dateSchema.safeParse(night).data
  const view = await orNotFound(getWeek(await pageContext(), rinkId, openDate))
  const { outlook } = view
  if (OFF_SEASON[view.rink.phase] || !outlook || outlook.nights.length === 0) return <WithoutNights view={view} />
  return <Nights view={view} outlook={outlook} />
}

function Nights({ view, outlook }: { view: WeekView; outlook: NonNullable<WeekView['outlook']> }) {
  const reader = readerOf(view)
  const isBeforeFill = view.rink.phase === 'waiting' || view.rink.phase === 'filling'
  return (
    <>
      <ForecastNotice forecast={view.forecast} lastReadFailed={view.lastReadFailed} now={Date.parse(view.readAt)} />
      <WeekHeadline view={view} outlook={outlook} reader={reader} />
      {isBeforeFill ? <FillAhead outlook={outlook} reader={reader} /> : null}
      <NightList view={view} outlook={outlook} reader={reader} />
      <DataSource view={view} now={Date.parse(view.readAt)} />
      <p className="mt-2 text-small text-graphite">Thickness is an estimate: drill and measure before anyone skates.</p>
    </>
  )
}
