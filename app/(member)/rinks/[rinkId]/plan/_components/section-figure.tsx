// The drawn cut with its caption, and the same as a table.
import { CrossSection } from '@/components/charts/cross-section'
import { layOutCut, WIDE } from '@/components/charts/cross-section-layout'
import { DataTable } from '@/components/ui/data-table'
import { Disclosure } from '@/components/ui/disclosure'
import type { BuildSums } from '@/lib/advice/build-types'
import { depthText, lengthText, pushText } from '@/lib/words/build-quantities'
import type { WordOptions } from '@/lib/words/options'
import { numberText } from '@/lib/words/quantities'

/** The section has 25 points; every fourth stands in the table. */
const TABLE_STEP = 4
/** Less fall than this is level ground, as anybody measures. [m] */
const LEVEL_M = 0.002

export function SectionFigure({ sums, reader }: { sums: BuildSums; reader: WordOptions }) {
  const { section, water, boards, push, ground } = sums
  const lengthM = section.at(-1)?.alongM ?? 0
  const isLevel = ground.fallM < LEVEL_M
  const leastM = water.deepestM - ground.fallM
  const [high, low] = [depthText(leastM, reader), depthText(water.deepestM, reader)]
  const labels = {
    description: isLevel
      ? `Cut along the level rink: ${low} of water, boards ${depthText(boards.heightM, reader)}.`
      : `Cut from the high to the low corner: ${high} of water at the high one, ${low} at the low one, where the boards are ` +
        `${depthText(boards.heightM, reader)} high.`,
    waterLine: 'water line',
    high: isLevel ? `level ground: ${low} of water` : `high corner: ${high} of water`,
    low: `${isLevel ? '' : `low corner: ${low}; `}boards ${depthText(boards.heightM, reader)}`,
    push: `push ${pushText(push.pushNPerM, reader)}`,
    fall: isLevel
      ? `${lengthText(lengthM, reader)} long`
      : `fall ${depthText(ground.fallM, reader)} over ${lengthText(lengthM, reader)}`,
  }
  return (
    <figure className="-mx-5 border-y border-rule bg-sheet px-5 py-4 lg:mx-0 lg:border-x print:mx-auto print:w-[72%] print:border-0 print:p-0">
      <CrossSection sums={sums} labels={labels} />
      <figcaption className="pt-2 text-small text-graphite">
        {isLevel ? 'Cut along the rink' : 'Cut from the high to the low corner'}; upright scale{' '}
        {numberText(layOutCut(sums, WIDE).exaggeration, 0, reader)} times the lengthwise one. Lined: water; dashed:
        liner.
      </figcaption>
      <Disclosure summary="Show as table" className="text-small print:hidden">
        <DataTable
          caption="The cut"
          columns={[{ head: 'Along' }, { head: 'Below the string', isFigure: true }, { head: 'Water', isFigure: true }]}
          rows={section
            .filter((_, index) => index % TABLE_STEP === 0)
            .map(({ alongM, floorM }) => ({
              key: String(alongM),
              cells: [
                lengthText(alongM, reader),
                depthText(floorM, reader),
                depthText(Math.max(0, floorM - water.levelM), reader),
              ],
            }))}
        />
      </Disclosure>
    </figure>
  )
}
