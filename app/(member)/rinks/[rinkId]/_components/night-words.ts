// The night in words, for the parts of the sheet.
import type { Reader } from '@/components/rinks/quantities'
import type { TonightView } from '@/lib/schemas/tonight-view'

export interface NightWords {
  sentence: string
  sure: string
  why: { lead: string; text: string; figure: string }[]
  cautions: string[]
}

export function nightWords(view: TonightView, _reader: Reader): NightWords {
  const summary = view.outlook?.summary
  return {
    sentence: summary?.verdict === 'flood' ? 'Flood tonight.' : 'Hold off.',
    sure: '',
    why: (summary?.why ?? []).map(({ code }) => ({ lead: code, text: '', figure: '' })),
    cautions: (summary?.cautions ?? []).map(({ code }) => code),
  }
}
