// Water at each corner by the flow of the hose, beside what was last read at the lowest.
import { CORNER_NAMES } from '@/components/rinks/corner-names'
import { Facts } from '@/components/ui/facts'
import { FILLING } from '@/lib/advice/thresholds'
import type { FillLook, OpenFillView } from '@/lib/schemas/filling-view'
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
          ? readText(read, reader)
          : 'Nobody has read the level yet: a stick at the lowest corner tells of a leak early.'}
      </p>
    </section>
  )
}

/** Beside what was read, what the flow should have made it; where they differ, what to do. */
function readText({ at, lowCornerDepthMm, reckonedDepthMm }: FillLook, reader: WordOptions): string {
  const depthMm = lowCornerDepthMm ?? 0
  const words = `Last read at the lowest corner: ${iceText(depthMm, reader)} at ${clockText(at, reader)}`
  const toleranceMm = FILLING.readingToleranceMm + FILLING.flowTolerance * reckonedDepthMm
  if (Math.abs(depthMm - reckonedDepthMm) <= toleranceMm) return `${words}, as the flow has it.`
  const advice = depthMm < reckonedDepthMm ? 'Look for a leak, or measure the flow again.' : 'Measure the flow again.'
  return `${words}, where the flow would make it ${iceText(reckonedDepthMm, reader)}. ${advice}`
}
