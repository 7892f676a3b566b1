// Water at each corner by the flow of the hose, beside what was last read at the lowest.
import { CORNER_NAMES } from '@/components/rinks/corner-names'
import { Facts } from '@/components/ui/facts'
import type { OpenFillView } from '@/lib/schemas/filling-view'
import { depthText } from '@/lib/words/build-quantities'
import type { WordOptions } from '@/lib/words/options'
import { iceText } from '@/lib/words/quantities'
import { clockText } from '@/lib/words/times'

export function Corners({ fill, reader }: { fill: OpenFillView; reader: WordOptions }) {
  const { progress, lowCorner, checks } = fill
  const read = checks.find(({ lowCornerDepthMm }) => lowCornerDepthMm !== null)
  const rows = progress.cornerDepthsM.map((depthM, corner) => ({
    name: `${CORNER_NAMES[corner] ?? ''}${corner === lowCorner ? ', the lowest' : ''}`,
    figure: depthM > 0 ? depthText(depthM, reader) : 'dry',
  }))
  return (
    <section className="mt-8">
      <h2 className="mb-2 font-semibold">Water at the corners</h2>
      <div className="border-t border-rule">
        <Facts rows={rows} />
      </div>
      <p className="mt-2 text-small text-graphite">
        Reckoned from the flow and the floor.{' '}
        {read
          ? `Last read at the lowest corner: ${iceText(read.lowCornerDepthMm ?? 0, reader)} at ${clockText(read.at, reader)}.`
          : 'Nobody has read the level yet: a stick at the lowest corner tells of a leak early.'}
      </p>
    </section>
  )
}
