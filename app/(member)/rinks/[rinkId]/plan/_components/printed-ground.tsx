// On paper only, where the form is left out: the sides, and how the ground lies, by corners or point by point.
import { pointField } from '@/lib/schemas/build-plan'
import { unitOf } from '@/lib/schemas/measures'
import { depthText, lengthText } from '@/lib/words/build-quantities'
import type { WordOptions } from '@/lib/words/options'
import { countOf, steps } from './point-grid'
import type { PlanForm } from './use-plan-form'

interface Props {
  form: Pick<PlanForm, 'sums' | 'values'>
  reader: WordOptions
}

export function PrintedGround({ form, reader }: Props) {
  const { ground, corners } = form.sums
  const { lengthM = 0, widthM = 0 } = ground.how.values
  const { floorKind } = form.values
  return (
    <div className="mb-1 hidden text-note print:block">
      <p>
        {lengthText(lengthM, reader)} × {lengthText(widthM, reader)}.{' '}
        {floorKind === 'level'
          ? 'Level ground.'
          : `Corners below the string: ${corners.map(({ floorM }) => depthText(floorM, reader)).join(', ')}.`}
      </p>
      {floorKind === 'grid' ? <PrintedPoints form={form} reader={reader} /> : null}
    </div>
  )
}

function PrintedPoints({ form: { values }, reader }: Props) {
  return (
    <table className="mt-1 text-small">
      <caption className="text-left">
        Points below the string, {unitOf('drop', reader.units)}; a row for each step along the length.
      </caption>
      <tbody>
        {steps(countOf(values.rows)).map((row) => (
          <tr key={row}>
            {steps(countOf(values.columns)).map((column) => (
              <td key={column} className="border border-rule px-1.5 text-right">
                {values[pointField(row, column)]?.trim() || '0'}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
