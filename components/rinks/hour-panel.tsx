// One hour opened: rate, set time if poured then, every part of the heat balance, and why.
'use client'
import type { HeatBalanceParts } from '@/lib/physics/types'
import type { TonightHour } from '@/lib/schemas/tonight-view'
import { Button } from '../ui/button'
import { Facts } from '../ui/facts'
import type { WordOptions } from '@/lib/words/options'
import { fluxText, rateText, temperatureText, windChillText } from '@/lib/words/quantities'
import { doneByDayText } from '@/lib/words/times'
import { HourReasons } from './hour-reasons'
import { VERDICT_WORDS } from './verdict-words'

const PARTS = [
  ['longwave', 'Lost to the sky'],
  ['sensible', 'to the air'],
  ['latent', 'by evaporation'],
  ['shortwave', 'from the sun'],
  ['precipitation', 'to snow and rain'],
] as const

interface HourPanelProps {
  hour: TonightHour | undefined
  name: string
  reader: WordOptions
  onStep: (step: number) => void
  onClose: () => void
}

export function HourPanel({ hour, name, reader, onStep, onClose }: HourPanelProps) {
  return (
    <>
      <p aria-live="polite" className="sr-only">
        {hour ? spokenHour(hour, name, reader) : ''}
      </p>
      {hour ? (
        <div className="border-t border-rule px-5 pt-3 pb-4 text-note">
          <div className="flex flex-wrap items-center gap-x-3">
            <h2 className="mr-auto text-lead font-semibold">
              {name}, {VERDICT_WORDS[hour.verdict]}
              {hour.isAvailable === false ? <span className="font-normal"> (outside your hours)</span> : null}
            </h2>
            <Button look="quiet" className="-mr-3 px-2" onClick={() => onStep(-1)}>
              Earlier
            </Button>
            <Button look="quiet" className="-mr-3 px-2" onClick={() => onStep(1)}>
              Later
            </Button>
            <Button look="quiet" onClick={onClose}>
              Close
            </Button>
          </div>
          {hour.isKnown ? <KnownHour hour={hour} reader={reader} /> : <p>There is no forecast for this hour.</p>}
        </div>
      ) : null}
    </>
  )
}

function KnownHour({ hour, reader }: { hour: TonightHour; reader: WordOptions }) {
  return (
    <div className="grid gap-x-14 gap-y-3 lg:grid-cols-[1fr_1.4fr]">
      <div className="grid content-start gap-y-3">
        <Facts
          isDense
          rows={[
            freezingOrMelting(hour, reader),
            {
              name: 'Poured then, set by',
              figure: hour.setsAt ? doneByDayText(hour.setsAt, hour.time, reader) : 'not within the forecast',
            },
            ...(hour.weather?.airTemperatureC != null
              ? [{ name: 'Air', figure: temperatureText(hour.weather.airTemperatureC, reader) }]
              : []),
            ...(hour.windChillC === null
              ? []
              : [{ name: 'Feels like', figure: windChillText(hour.windChillC, reader) }]),
          ]}
        />
        {hour.parts ? <HeatBalance parts={hour.parts} net={hour.netHeatLossWm2 ?? 0} reader={reader} /> : null}
      </div>
      <HourReasons hour={hour} reader={reader} />
    </div>
  )
}

/** Gains count against the loss, so the sun stands with a minus and the column adds up to its sum. */
function HeatBalance({ parts, net, reader }: { parts: HeatBalanceParts; net: number; reader: WordOptions }) {
  const figures = { ...parts, shortwave: -parts.shortwave }
  return (
    <Facts
      isDense
      rows={[
        ...PARTS.map(([part, name]) => ({ name, figure: fluxText(figures[part], reader) })),
        { name: 'In all', figure: fluxText(net, reader), isSum: true },
      ]}
    />
  )
}

function freezingOrMelting({ freezeRateMmPerH }: TonightHour, reader: WordOptions): { name: string; figure: string } {
  const rate = freezeRateMmPerH ?? 0
  return { name: rate < 0 ? 'Melts' : 'Freezes', figure: rateText(Math.abs(rate), reader) }
}

function spokenHour(hour: TonightHour, name: string, reader: WordOptions): string {
  if (!hour.isKnown) return `${name}: no forecast.`
  const { name: does, figure } = freezingOrMelting(hour, reader)
  const set = hour.setsAt
    ? `Poured then, set by ${doneByDayText(hour.setsAt, hour.time, reader)}.`
    : 'Poured then, not set within the forecast.'
  return `${name}: ${VERDICT_WORDS[hour.verdict]}. ${does} ${figure}. ${set}`
}
