// The season in figures.
import type { SeasonTotals } from '@/lib/services/log-book'
import { muchWaterText } from '@/lib/words/log'
import type { WordOptions } from '@/lib/words/options'
import { iceText } from '@/lib/words/quantities'

export interface Figure {
  name: string
  figure: string
  note?: string
}

export function totalFigures(totals: SeasonTotals, reader: WordOptions): Figure[] {
  const { skating, kept, thicknessMm } = totals
  const figures: Figure[] = [
    { name: 'Nights flooded', figure: String(totals.nightsFlooded) },
    { name: 'Floods', figure: String(totals.floods) },
    { name: 'Water', figure: muchWaterText(totals.waterL, reader) },
    { name: 'Readings', figure: String(totals.readings) },
  ]
  if (thicknessMm !== null) figures.push({ name: 'Ice now, by the model', figure: iceText(thicknessMm, reader) })
  if (skating) {
    figures.push({
      name: 'Days the sheet carried a skater',
      figure: String(skating.days),
      note: `of ${skating.onRecord} on record, by model and readings`,
    })
  }
  if (kept.of > 0) figures.push({ name: 'Advice kept', figure: `${kept.kept} of ${kept.of}`, note: 'nights settled' })
  return figures
}

export function Totals({ figures }: { figures: readonly Figure[] }) {
  return (
    <dl className="grid grid-cols-2 gap-x-6 border-t border-rule">
      {figures.map(({ name, figure, note }) => (
        <div key={name} className="border-b border-rule py-3">
          <dt className="text-small text-graphite">{name}</dt>
          <dd className="text-lead font-medium">
            {figure}
            {note ? <span className="block text-small font-normal text-graphite">{note}</span> : null}
          </dd>
        </div>
      ))}
    </dl>
  )
}
