// How Nightsheet comes to its advice, from what, and where it stops. Short, and nothing that is not so.
import type { Metadata } from 'next'
import Link from 'next/link'
import { PageFrame } from '@/components/ui/page-frame'

export const metadata: Metadata = { title: 'How it works' }

const STEPS = [
  {
    name: 'The weather of your yard.',
    text: 'Once an hour we read the forecast for the few square kilometres round your rink, and bring its wind down to the ice with the shelter you told us of. When a newer forecast cannot be had we keep the last one and say how old it is.',
  },
  {
    name: 'The heat that leaves the water.',
    text: 'For every hour we add up what a wet sheet at 0 °C loses to the sky, to cold air and wind and by evaporation, and take off what the sun, rain and snow bring. That is why a clear, dry night just above freezing can set a flood which a cloudy, damp night below it leaves wet.',
  },
  {
    name: 'The sheet below.',
    text: 'A cold sheet draws heat from the new layer as well. Its thickness and temperature are carried forward hour by hour from the weather and from the passes you check off.',
  },
  {
    name: 'The advice.',
    text: 'An hour is good for a flood when a layer poured then sets in reasonable time, before it is needed, and before snow or rain reaches it, in wind and cold that the ice, the hose and you can stand. One fatal point is fatal. Passes are planned inside the hours you can go out, each only once the last is set.',
  },
  {
    name: 'How sure.',
    text: 'The same judgement is made on other runs of the forecast, or on runs disturbed as forecasts of that age are known to err. The share that agrees is on the page.',
  },
]

const SOURCES = [
  'Sky radiation: Prata 1996; cloud: Unsworth & Monteith 1975.',
  'Humidity: World Meteorological Organization, Guide No. 8.',
  'Ice growth: Stefan 1891 and Ashton 1989.',
  'Joining the points into one score: Derringer & Suich 1980.',
  'Wind chill and frostbite times: Environment Canada.',
  'Rules of thumb: written practice of towns and rink keepers, each named in the source code beside its figure.',
]

const LIMITS = [
  'A forecast is for an area; your yard can be several degrees colder or warmer on a still, clear night.',
  'Thickness is an estimate. Drill and measure before anyone skates; the keeper decides.',
  'It is for ice on land, on a liner or frozen ground. It never calls ice on ponds, lakes or rivers safe: ask your local authority there.',
  'By-laws, water restrictions and licensed trades come first.',
]

export default function HowItWorksPage() {
  return (
    <PageFrame>
      <p>
        <Link href="/" className="inline-flex min-h-touch items-center font-semibold no-underline">
          Nightsheet
        </Link>
      </p>
      <h1 className="mt-4 mb-5 text-verdict font-medium tracking-tight lg:text-verdict-wide">How it works</h1>
      <ol className="max-w-line list-none border-t border-rule p-0">
        {STEPS.map(({ name, text }) => (
          <li key={name} className="border-b border-rule py-3">
            <b className="font-medium">{name}</b> {text}
          </li>
        ))}
      </ol>
      <Lines title="What it cannot know" lines={LIMITS} />
      <Lines title="What it rests on" lines={SOURCES} />
    </PageFrame>
  )
}

function Lines({ title, lines }: { title: string; lines: string[] }) {
  return (
    <section className="max-w-line">
      <h2 className="mt-8 mb-2 font-semibold">{title}</h2>
      <ul className="list-none border-t border-rule p-0">
        {lines.map((line) => (
          <li key={line} className="border-b border-rule py-2">
            {line}
          </li>
        ))}
      </ul>
    </section>
  )
}
