// How Nightsheet comes to its advice, by which formulas, how well it does, and where it stops.
import type { Metadata } from 'next'
import { HelpPage } from '../_components/help-page'
import { NamedLines } from '../_components/named-lines'
import { AccuracyTables } from './_components/accuracy-tables'
import { FormulaList } from './_components/formula-list'
import { ADVICE_FORMULAS, HEAT_FORMULAS, ICE_FORMULAS } from './_components/formulas'

export const metadata: Metadata = { title: 'How it works' }

const STEPS = [
  {
    name: 'The weather of your yard.',
    text: 'Once an hour we read the forecast for the few square kilometres round your rink, and bring its wind down to the ice with the shelter you told us of. When a newer forecast cannot be had we keep the last one and say how old it is.',
  },
  {
    name: 'The heat that leaves the water.',
    text: 'For every hour we add up what a wet sheet at 0 °C loses to the sky, to cold air and wind and by evaporation, and take off what sun and rain bring. That is why a clear, dry night just above freezing can set a flood which a cloudy, damp night below it leaves wet.',
  },
  {
    name: 'The sheet below.',
    text: 'A cold sheet draws heat from the new layer as well. Its thickness and temperature are carried forward hour by hour from the weather, from what you log, and from the holes you drill.',
  },
  {
    name: 'The advice.',
    text: 'An hour is good for a flood when a layer poured then sets in reasonable time, before it is needed, and before snow or rain reaches it, in wind and cold that the ice, the hose and you can stand. Passes are planned inside the hours you can go out, each only once the last is set.',
  },
  {
    name: 'How sure.',
    text: 'The same judgement is made on other runs of the forecast. The share that agrees is on the page. Tonight is for deciding; more than three days ahead is for planning.',
  },
]

const LIMITS = [
  {
    name: 'Your yard is not the forecast’s square.',
    text: 'On a still, clear night it can be several degrees colder or warmer. Reports of when a flood was set teach the model your yard.',
  },
  { name: 'Thickness is an estimate.', text: 'Drill and measure before anyone skates; the keeper decides.' },
  {
    name: 'Land only.',
    text: 'It is for ice on a liner or frozen ground. It never calls ice on ponds, lakes or rivers safe: ask your local authority there.',
  },
  {
    name: 'One column of ice.',
    text: 'No cracks, no shade that wanders with the sun, no leak, no warm wall along one side. Water stays where it falls.',
  },
  {
    name: 'Snow ice.',
    text: 'Snow that soaks and freezes is taken as water that freezes; its rough white layer is yours to scrape.',
  },
]

export default function HowItWorksPage() {
  return (
    <HelpPage
      title="How it works"
      lead="A heat balance for every hour, a sheet carried through the season, and advice that says how sure it is."
    >
      <NamedLines title="From weather to advice" lines={STEPS} isOrdered />
      <AccuracyTables />
      <NamedLines title="What it cannot know" lines={LIMITS} />
      <h2 className="mb-3 text-lead font-medium">The formulas</h2>
      <FormulaList title="Heat of an hour" formulas={HEAT_FORMULAS} />
      <FormulaList title="Water that freezes" formulas={ICE_FORMULAS} />
      <FormulaList title="Advice and the person" formulas={ADVICE_FORMULAS} />
    </HelpPage>
  )
}
