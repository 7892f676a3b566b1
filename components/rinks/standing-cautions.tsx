// Cautions that hold whenever water or new ice is about, by their codes.
import type { WordOptions } from '@/lib/words/options'
import { Cautions } from './cautions'

export type StandingCaution =
  | 'not_alone'
  | 'wet_pavement'
  | 'backflow'
  | 'run_off'
  | 'electric_leads'
  | 'hot_water'
  | 'thickness_is_estimate'
  | 'land_only'

export function StandingCautions({
  codes,
  reader,
  heading,
}: {
  codes: readonly StandingCaution[]
  reader: WordOptions
  heading: string
}) {
  return <Cautions cautions={codes.map((code) => ({ code, values: {} }))} reader={reader} heading={heading} />
}
