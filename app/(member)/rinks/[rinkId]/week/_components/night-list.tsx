// One row a night, noon to noon; after the third a line says where deciding ends and planning begins.
import { Fragment } from 'react'
import type { WeekView } from '@/lib/schemas/week-view'
import type { WordOptions } from '@/lib/words/options'
import { barScale } from './bar-scale'
import { NightRow } from './night-row'
import { OpenNight } from './open-night'

interface NightListProps {
  view: WeekView
  outlook: NonNullable<WeekView['outlook']>
  reader: WordOptions
}

export function NightList({ view, outlook, reader }: NightListProps) {
  const { nights, open } = outlook
  const scale = barScale(nights)
  const firstFar = nights.find(({ isFar }) => isFar)
  return (
    <>
      <ol className="-mx-5 list-none border-t border-rule bg-sheet p-0 lg:mx-0 lg:border-x">
        {nights.map((night) => {
          const isOpen = night.nightDate === open?.nightDate
          return (
            <Fragment key={night.nightDate}>
              {night === firstFar ? <Horizon /> : null}
              <li id={`night-${night.nightDate}`} className="scroll-mt-4 border-b border-rule">
                <NightRow rinkId={view.rink.id} night={night} scale={scale} isOpen={isOpen} reader={reader} />
                {isOpen ? <OpenNight night={night} hours={open?.hours ?? []} view={view} reader={reader} /> : null}
              </li>
            </Fragment>
          )
        })}
      </ol>
      <p className="mt-3 max-w-line text-small text-graphite">
        Bars: how fast water would freeze, hour by hour from noon to noon, all nights to one scale; below the line it
        melts. Solid is an hour to flood, barred one to fill, an outline one to hold off; the darker ground is the
        night. Beside them: ice gained or lost from noon to noon with the floods named, and how many forecast runs find
        good hours when you can go out. Passes of later nights are counted from their good hours; the plan is made on
        the day.
      </p>
    </>
  )
}

function Horizon() {
  return (
    <li className="border-b border-rule bg-paper px-5 py-2 text-small text-graphite">
      More than three days out: good for planning, too far to decide on.
    </li>
  )
}
