// The words along the strip.
import type { TonightHour } from '@/lib/schemas/tonight-view'
import { amountText } from './amount-text'
import { describeNight } from './strip-description'
import type { StripWords } from '../charts/strip-parts'
import { xOf, type StripInput } from '../charts/night-strip-layout'
import { placeLabels, tickInstants, tickLabel, wetRuns, type WetRun } from '../charts/strip-labels'
import type { WordOptions } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'

const CHARACTER = 6.3
const axisNumber = (value: number) => String(value).replace('-', '−')

export function stripWords(input: StripInput, hours: TonightHour[], reader: WordOptions): StripWords {
  const middleOf = (run: WetRun) => (xOf(input, run.startsAt) + xOf(input, run.endsAt)) / 2
  const runs = wetRuns(input.hours, input.startsAt, input.endsAt)
  return {
    title: 'How fast water freezes, hour by hour',
    description: describeNight(hours, reader),
    hourTicks: tickInstants(input.startsAt, input.endsAt, reader.timeZone).map(({ at, localHour }) => ({
      x: xOf(input, at),
      text: tickLabel(localHour, reader.clock),
    })),
    amounts: placeLabels(
      runs.map((run) => ({ x: middleOf(run), text: amountText(run, reader) })),
      input.frame.width,
      CHARACTER,
    ),
    rateLabel: axisNumber,
    airLabel: (value) => `${axisNumber(value)}°`,
    passLabel: (number, width) => (width > 44 ? `Pass ${number}` : String(number)),
    now: input.now === null ? '' : `now ${clockText(new Date(input.now), reader)}`,
    gap: 'no forecast',
  }
}
