// How much of the water is in, as a barred bar; the words are in the sentence above and in the caption.
import { BarredPattern } from '@/components/charts/barred-pattern'
import type { OpenFillView } from '@/lib/schemas/filling-view'
import type { WordOptions } from '@/lib/words/options'
import { flowText, iceText, waterText } from '@/lib/words/quantities'

const WIDTH = 1000
const HEIGHT = 28

export function FillBar({ fill, reader }: { fill: OpenFillView; reader: WordOptions }) {
  const { progress, targetL, targetDepthMm, flowLPerMin } = fill
  const percent = Math.round(progress.doneShare * 100)
  return (
    <figure className="-mx-5 border-y border-rule bg-sheet px-5 py-4 lg:mx-0 lg:border-x">
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        preserveAspectRatio="none"
        role="img"
        aria-label={`${percent} per cent of the water is in`}
        className="block h-7 w-full"
      >
        <defs>
          <BarredPattern id="fill-barred" />
        </defs>
        <rect width={WIDTH * progress.doneShare} height={HEIGHT} fill="url(#fill-barred)" />
        <rect
          width={WIDTH}
          height={HEIGHT}
          fill="none"
          strokeWidth="1.5"
          vectorEffect="non-scaling-stroke"
          className="stroke-hose"
        />
      </svg>
      <figcaption className="mt-2 flex flex-wrap gap-x-5 text-small text-graphite">
        <span>
          {waterText(progress.litres, reader)} of {waterText(targetL, reader)}
        </span>
        <span>mean depth wanted {iceText(targetDepthMm, reader)}</span>
        <span>{progress.isRunning ? `hose running at ${flowText(flowLPerMin, reader)}` : 'hose off'}</span>
      </figcaption>
    </figure>
  )
}
