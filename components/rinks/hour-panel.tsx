// One hour opened: rate, set time if poured then, every part of the heat balance, and why.
'use client'
import type { TonightHour } from '@/lib/schemas/tonight-view'
import { Button } from '../ui/button'
import { clockTime, heatText, rateText, temperatureText, type Reader } from './quantities'
import { VERDICT_WORDS } from './strip-words'

interface HourPanelProps {
  hour: TonightHour | undefined
  reader: Reader
  onStep: (step: number) => void
  onClose: () => void
}

export function HourPanel({ hour, reader, onStep, onClose }: HourPanelProps) {
  return (
    <>
      <p aria-live="polite" className="sr-only">
        {hour ? spokenHour(hour, reader) : ''}
      </p>
      {hour ? (
        <div className="border-t border-rule px-5 pt-3 pb-4 text-note">
          <div className="flex flex-wrap items-center gap-x-3">
            <h2 className="mr-auto text-lead font-semibold">
              {clockTime(hour.time, reader)}, {VERDICT_WORDS[hour.verdict]}
            </h2>
            <Button look="quiet" onClick={() => onStep(-1)}>
              Earlier
            </Button>
            <Button look="quiet" onClick={() => onStep(1)}>
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

function KnownHour({ hour, reader }: { hour: TonightHour; reader: Reader }) {
  const { parts } = hour
  return (
    <div className="grid gap-x-14 gap-y-3 lg:grid-cols-2">
      <dl>
        <Row name="Freezes" figure={rateText(hour.freezeRateMmPerH ?? 0, reader)} />
        <Row
          name="Poured then, set by"
          figure={hour.setsAt ? clockTime(hour.setsAt, reader) : 'not within the forecast'}
        />
        {hour.windChillC === null ? null : <Row name="Feels like" figure={temperatureText(hour.windChillC, reader)} />}
      </dl>
      {parts ? (
        <dl>
          <Row name="Heat lost to the sky" figure={heatText(parts.longwave)} />
          <Row name="to cold air and wind" figure={heatText(parts.sensible)} />
          <Row name="by evaporation" figure={heatText(parts.latent)} />
          <Row name="gained from the sun" figure={heatText(parts.shortwave)} />
          <Row name="through rain and snow" figure={heatText(parts.precipitation)} />
          <Row name="In all, lost" figure={heatText(hour.netHeatLossWm2 ?? 0)} isSum />
        </dl>
      ) : null}
    </div>
  )
}

function Row({ name, figure, isSum }: { name: string; figure: string; isSum?: boolean }) {
  return (
    <div className={`grid grid-cols-[1fr_auto] gap-3 py-0.5 ${isSum ? 'border-t border-graphite font-medium' : ''}`}>
      <dt>{name}</dt>
      <dd>{figure}</dd>
    </div>
  )
}

function spokenHour(hour: TonightHour, reader: Reader): string {
  if (!hour.isKnown) return `${clockTime(hour.time, reader)}: no forecast.`
  const set = hour.setsAt
    ? `Poured then, set by ${clockTime(hour.setsAt, reader)}.`
    : 'Poured then, not set within the forecast.'
  return `${clockTime(hour.time, reader)}: ${VERDICT_WORDS[hour.verdict]}. Freezes ${rateText(hour.freezeRateMmPerH ?? 0, reader)}. ${set}`
}
