// The water tonight's plan rests on: what the tap gives, and what the passes take in all.
import { Facts } from '@/components/ui/facts'
import { durationText, flowText, temperatureText, waterText } from '@/lib/words/quantities'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import type { WordOptions } from '@/lib/words/options'

interface WaterAndHoseProps {
  water: TonightView['rink']['water']
  /** As moved so far. */
  passes: readonly TonightPass[]
  reader: WordOptions
}

export function WaterAndHose({ water, passes, reader }: WaterAndHoseProps) {
  const planned = passes.filter((pass) => pass.poured === null)
  // A pass of the keeper's may take other water than the rink usually gets.
  const waters = planned.length > 0 ? planned : [water]
  const temperatures = new Set(waters.map(({ temperatureC }) => temperatureText(temperatureC, reader)))
  const flows = new Set(waters.map(({ flowLPerMin }) => flowText(flowLPerMin, reader)))
  const litres = planned.reduce((sum, pass) => sum + pass.waterL, 0)
  const minutes = planned.reduce((sum, pass) => sum + pass.hoseMinutes, 0)
  return (
    <section>
      <h2 className="mt-8 mb-2 text-body font-semibold">Water and hose</h2>
      <Facts
        rows={[
          { name: 'Water at the hose', figure: [...temperatures].join(', ') },
          { name: 'Flow', figure: [...flows].join(', ') },
          ...(planned.length > 0
            ? [{ name: 'Still to pour tonight', figure: `${waterText(litres, reader)}, ${durationText(minutes)}` }]
            : []),
        ]}
      />
    </section>
  )
}
