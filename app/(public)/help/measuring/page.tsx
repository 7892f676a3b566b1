// How to measure what the model is told: the hose, the ground, the ice, and the water.
import type { Metadata } from 'next'
import { HelpPage } from '../../_components/help-page'
import { NamedLines } from '../../_components/named-lines'

export const metadata: Metadata = { title: 'How to measure' }

const FLOW = [
  {
    name: 'Take a bucket whose size you know.',
    text: 'Ten litres or more; weigh it full on a bathroom scale if nothing is printed on it: one kilogram is one litre, 8.3 pounds are one US gallon.',
  },
  {
    name: 'Use the whole hose.',
    text: 'Lay it out as on the night, with its nozzle or without, tap fully open. A long thin hose gives far less than the tap does.',
  },
  {
    name: 'Time it to the brim.',
    text: 'Do it three times and take the middle one. Ten litres in 24 seconds are 25 litres a minute: litres, divided by seconds, times 60.',
  },
  {
    name: 'Do it at the hour you flood.',
    text: 'In the evening, when the street waters and washes, pressure may be lower.',
  },
]

const SLOPE = [
  {
    name: 'Drive a stake at each corner',
    text: 'of the rink to be, and stretch a string round them at knee height.',
  },
  {
    name: 'Level the string.',
    text: 'Hang a line level in the middle of each side and raise or lower one end until the bubble stands. Over more than ten metres a clear hose filled with water is better: the water stands equally high at both ends.',
  },
  {
    name: 'Measure down at every corner,',
    text: 'from string to ground, and at the middle of each side if the ground waves. The largest figure is your low corner.',
  },
  {
    name: 'Type the corners in as they are.',
    text: 'The difference between the largest and the smallest is the slope. Water lies level, so at the low corner it stands deeper by just that, and the boards there must hold it.',
  },
]

const THICKNESS = [
  {
    name: 'Test from the edge.',
    text: 'Step on only once a hole at the edge shows enough, and go on from hole to hole. Children wait off the ice.',
  },
  {
    name: 'Drill at least four holes:',
    text: 'near two corners, at the deep end, and in the middle. A 10 mm wood bit in a cordless drill does; stop when water comes or the bit spins free, and mind the liner: mark the bit with tape and go in steps.',
  },
  {
    name: 'Hook a bent wire or a ruler',
    text: 'under the lower edge of the ice and read at the surface. Count clear ice and white ice apart: white ice is weaker.',
  },
  {
    name: 'Log the smallest figure',
    text: 'with the time. The model takes the sheet from there, and what it had said stands beside it in the log.',
  },
  { name: 'Fill the holes', text: 'with slush, and mark them until they are hard.' },
]

const WATER = [
  {
    name: 'Let the hose run until its warmth is gone,',
    text: 'two or three minutes, then hold a kitchen thermometer in the stream for a minute.',
  },
  {
    name: 'Measure again in January.',
    text: 'Mains cool through the winter, from ten degrees or more in autumn to a few above freezing.',
  },
  {
    name: 'From a hot tap',
    text: 'measure at the end of the hose: a long hose on snow gives much of it away before it reaches the ice.',
  },
]

export default function MeasuringPage() {
  return (
    <HelpPage
      title="How to measure"
      lead="Four things the model cannot see from a forecast. Each takes a quarter of an hour, and the first two you do once."
    >
      <NamedLines title="Flow of the hose, with a bucket" lines={FLOW} isOrdered />
      <NamedLines title="Slope of the ground, with string and level" lines={SLOPE} isOrdered />
      <NamedLines title="Thickness of the ice, with a drill" lines={THICKNESS} isOrdered />
      <NamedLines title="Temperature of the water" lines={WATER} isOrdered />
    </HelpPage>
  )
}
