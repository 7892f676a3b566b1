// The water tonight's plan rests on: what the tap gives, and what the passes take in all.
import { Facts } from '@/components/ui/facts'
import { readerOf } from '@/components/rinks/reader'
import { durationText, temperatureText, waterText } from '@/lib/words/quantities'
import type { TonightView } from '@/lib/schemas/tonight-view'

export function WaterAndHose({ view }: { view: TonightView }) {
  const reader = readerOf(view)
  const planned = (view.outlook?.passes ?? []).filter((pass) => pass.poured === null)
  // A pass of the keeper's may take other water than the rink usually gets.
  const waters = planned.length > 0 ? planned : [view.rink.water]
  const temperatures = new Set(waters.map(({ temperatureC }) => temperatureText(temperatureC, reader)))
  const flows = new Set(waters.map(({ flowLPerMin }) => waterText(flowLPerMin, reader)))
  const litres = planned.reduce((sum, pass) => sum + pass.waterL, 0)
  const minutes = planned.reduce((sum, pass) => sum + pass.hoseMinutes, 0)
  return (
    <section>
      <h2 className="mt-8 mb-2 text-body font-semibold">Water and hose</h2>
      <Facts
        rows={[
          { name: 'Water at the hose', figure: [...temperatures].join(', ') },
          { name: 'Flow', figure: `${[...flows].join(', ')} a minute` },
          ...(planned.length > 0
            ? [{ name: 'Still to pour tonight', figure: `${waterText(litres, reader)}, ${durationText(minutes)}` }]
            : []),
        ]}
      />
    </section>
  )
}
