// What the strip's marks mean, in words; every verdict with its own pattern.
import type { StripHour } from '../charts/night-strip-layout'
import type { StripSource } from './strip-input'
import type { WordOptions } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'

interface LegendProps {
  night: StripSource['night']
  reader: WordOptions
  drawn: StripHour[]
}

export function NightLegend({ night, reader, drawn }: LegendProps) {
  const { sunsetAt, sunriseAt } = night
  const has = (verdict: StripHour['verdict']) => drawn.some((hour) => hour.verdict === verdict)
  return (
    <ul className="flex list-none pt-2 flex-wrap gap-x-[18px] gap-y-1 p-0 text-small text-graphite">
      {has('flood') ? (
        <Key word="flood">
          <rect x={1} y={1} width={13} height={11} className="fill-lamp stroke-lamp-text" />
        </Key>
      ) : null}
      {has('fill') ? (
        <Key word="fill">
          <path d="M1,2 h13 M1,6 h13 M1,10 h13" className="stroke-hose" strokeWidth={1.8} />
        </Key>
      ) : null}
      <Key word="hold off">
        <rect x={1} y={1} width={13} height={11} fill="none" className="stroke-still" strokeWidth={1.3} />
      </Key>
      <Key word={`air, °${reader.units.temperature}`}>
        <path d="M0,6.5 h15" className="stroke-ink" strokeWidth={2} />
      </Key>
      {drawn.some((hour) => !hour.isOpen) ? (
        <Key word="your hours">
          <path d="M0,6.5 h15" className="stroke-ink" strokeWidth={4} />
        </Key>
      ) : null}
      {drawn.some((hour) => hour.rate === null) ? (
        <Key word="no forecast">
          <path d="M0,10 l8,-8 M4,12 l9,-9 M9,13 l6,-6" className="stroke-still" strokeWidth={1.3} />
        </Key>
      ) : null}
      <li>
        {reader.units.ice === 'in' ? 'bars: inches of water frozen per hour' : 'bars: mm of water frozen per hour'}
      </li>
      {sunsetAt && sunriseAt ? (
        <li>
          dark from {clockText(sunsetAt, reader)} to {clockText(sunriseAt, reader)}
        </li>
      ) : null}
    </ul>
  )
}

function Key({ word, children }: { word: string; children: React.ReactNode }) {
  return (
    <li className="inline-flex items-center gap-[7px]">
      <svg width={15} height={13} aria-hidden="true">
        {children}
      </svg>
      {word}
    </li>
  )
}
