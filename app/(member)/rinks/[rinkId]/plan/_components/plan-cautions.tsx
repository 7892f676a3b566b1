// What to mind before building: what these sums call for, then what always holds.
import { Notice } from '@/components/ui/notice'
import type { Caution } from '@/lib/advice/types'
import { cautionText } from '@/lib/words/cautions'
import type { WordOptions } from '@/lib/words/options'
import { sumCautionText } from '@/lib/words/sum-cautions'

const ALWAYS = ['backflow', 'run_off', 'electric_leads', 'land_only']

export function PlanCautions({ cautions, reader }: { cautions: readonly Caution[]; reader: WordOptions }) {
  return (
    <section className="mt-8 print:mt-2 print:[&_p]:text-small">
      <h2 className="mb-2 font-semibold">Mind before you build</h2>
      <Notice tone="caution">
        {cautions.map((caution) => (
          <p key={caution.code} className="my-1">
            {sumCautionText(caution, reader)}
          </p>
        ))}
        <p className="my-1">
          The push is that of still water. How boards, braces and stakes are to be made is for who builds them, and
          local rules and water restrictions come first.
        </p>
        {ALWAYS.map((code) => (
          <p key={code} className="my-1 print:hidden">
            {cautionText({ code, values: {} }, reader)}
          </p>
        ))}
      </Notice>
    </section>
  )
}
