// What the parts of the strip's drawing share: their words, and the heights under the plot.
import type { StripLayout } from './night-strip-layout'
import type { PlacedLabel } from './strip-labels'

export interface StripWords {
  title: string
  description: string
  hourTicks: PlacedLabel[]
  amounts: PlacedLabel[]
  rateLabel: (value: number) => string
  airLabel: (value: number) => string
  passLabel: (number: number, width: number) => string
  now: string
  gap: string
}

export interface StripPartProps {
  layout: StripLayout
  words: StripWords
}

/** Heights under the plot: marks of snow and rain, their amounts, the hours. */
export const FLOOR = { ground: 19, marks: 10, amounts: 33, hours: 54 }
