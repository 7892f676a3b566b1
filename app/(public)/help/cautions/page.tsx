// Every caution of the product in one place, for ice, people, water and the law.
import type { Metadata } from 'next'
import { Notice } from '@/components/ui/notice'
import { HelpPage } from '../../_components/help-page'
import { NamedLines } from '../../_components/named-lines'

export const metadata: Metadata = { title: 'Cautions' }

const ICE = [
  {
    name: 'Ice on land only.',
    text: 'Nothing here says that ice on a pond, a lake or a river is safe. Water moves under it, springs and snow thin it. Follow your local authority there.',
  },
  {
    name: 'Drill before anyone skates.',
    text: 'A figure on this page is an estimate from weather and from what was logged. Measure in several places, at the deep end too, and again after every thaw. The keeper decides.',
  },
  {
    name: 'Water under ice.',
    text: 'While a deep fill freezes, and in a thaw, liquid water stands under or on the sheet. Keep small children away, and put up the sign that says keep off.',
  },
  {
    name: 'Hard and uneven.',
    text: 'Helmets for those who skate, light on the whole sheet, cracks and holes filled before it opens.',
  },
]

const PERSON = [
  {
    name: 'Cold.',
    text: 'From a wind chill of −28 bare skin freezes within half an hour, from −40 within ten minutes, from −48 within five. Wet gloves shorten that. The page says what it feels like at the hour it advises; let a night go rather than a finger.',
  },
  {
    name: 'Not alone.',
    text: 'Flood with somebody, or tell somebody when you will be back in and what to do if you are not. Carry a phone that is charged and warm.',
  },
  {
    name: 'Scald.',
    text: 'Water at 60 °C burns skin within seconds. Carry no open pails on ice, use a hose that is made for hot water, and bleed it before you unscrew it.',
  },
  {
    name: 'Footing.',
    text: 'Cleats on the ice, and the hose laid where nobody steps over it in the dark.',
  },
]

const SURROUNDINGS = [
  {
    name: 'Wet hose across a pavement.',
    text: 'What drips freezes. Keep it off walks, steps and the street, or sand them; people fall there, and you answer for it.',
  },
  {
    name: 'Electricity.',
    text: 'Leads and plugs out of water and snow, cords made for outdoors, on a circuit that trips at a fault to earth. New outlets are for an electrician.',
  },
  {
    name: 'Run-off.',
    text: 'A thaw lets go of all the water you poured. See where it will run before you fill: not toward a neighbour, a cellar or the street.',
  },
  {
    name: 'Backflow.',
    text: 'A hose end that lies in water can be sucked back into the mains. Put a backflow preventer on the tap.',
  },
  {
    name: 'Hose and pipes.',
    text: 'Drain the hose between passes and shut the indoor valve of the tap afterwards: what stays in freezes and bursts.',
  },
]

const RULES = [
  {
    name: 'By-laws and water restrictions come first.',
    text: 'Ask before you build on ground that is not yours, before you open a hydrant, and when watering is restricted. A restriction can come overnight.',
  },
  {
    name: 'Licensed trades.',
    text: 'Plumbing and wiring that the law leaves to a trade, leave to the trade.',
  },
  {
    name: 'Insurance.',
    text: 'Tell your insurer about a rink that others use. Keep the log factual: what was measured, what was done, when.',
  },
  {
    name: 'No emergency service.',
    text: 'Nightsheet advises on ice making. It watches over nobody; in an emergency call the number that your country has for it.',
  },
]

export default function CautionsPage() {
  return (
    <HelpPage title="Cautions" lead="What the model does not see, and what stands above any advice of it.">
      <div className="max-w-line">
        <Notice tone="caution">
          <p>“Flood tonight” is about making ice. It never means that the ice carries.</p>
        </Notice>
      </div>
      <div className="gap-x-14 lg:grid lg:grid-cols-2">
        <NamedLines title="The ice" lines={ICE} />
        <NamedLines title="The person" lines={PERSON} />
        <NamedLines title="Around the rink" lines={SURROUNDINGS} />
        <NamedLines title="Rules" lines={RULES} />
      </div>
    </HelpPage>
  )
}
