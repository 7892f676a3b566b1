// Every factor of an hour, those of the ice and those of the person apart: never averaged, each caps the score by itself.
import type { TonightHour } from '@/lib/schemas/tonight-view'
import { isPersonal } from '@/lib/advice/personal'
import type { Reason } from '@/lib/advice/types'
import type { WordOptions } from '@/lib/words/options'
import { reasonText } from '@/lib/words/reasons'
import { Facts } from '../ui/facts'

const share = (factor: number) => `${Math.round(factor * 100)} %`

export function HourReasons({ hour, reader }: { hour: TonightHour; reader: WordOptions }) {
  const rows = (reasons: Reason[]) =>
    reasons.map((reason) => ({ name: reasonText(reason, reader), figure: share(reason.factor) }))
  return (
    <div>
      <h3 className="font-medium">For the ice{hour.limits ? `: ${hour.limits.ice} of 100` : ''}</h3>
      <Facts isDense rows={rows(hour.reasons.filter(({ code }) => !isPersonal(code)))} />
      <h3 className="mt-3 font-medium">For you{hour.limits ? `: ${hour.limits.person} of 100` : ''}</h3>
      <Facts isDense rows={rows(hour.reasons.filter(({ code }) => isPersonal(code)))} />
      <p className="mt-1 text-small text-graphite">
        Each factor from 0 to 100 %: how much it lets through. The lower of the two marks decides.
      </p>
    </div>
  )
}
