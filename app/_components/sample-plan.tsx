// The passes that the model plans for the sample night.
import type { PlannedPass } from '@/lib/advice/types'
import type { WordOptions } from '@/lib/words/options'
import { passDetail, passLayer } from '@/lib/words/pass'
import { clockText } from '@/lib/words/times'

export function SamplePlan({ passes, reader }: { passes: readonly PlannedPass[]; reader: WordOptions }) {
  return (
    <div className="mt-5 xl:mt-0">
      <h3 className="mb-1 font-semibold">Its plan</h3>
      <ol className="list-none border-t border-rule p-0">
        {passes.map((pass) => (
          <li key={pass.startsAt} className="grid grid-cols-[92px_1fr] border-b border-rule py-2 xl:block">
            <span className="text-lead font-semibold">{clockText(pass.startsAt, reader)}</span>
            <span className="block text-note">
              {passLayer(pass, reader)}
              <span className="block text-graphite">{passDetail(pass, reader)}</span>
            </span>
          </li>
        ))}
      </ol>
    </div>
  )
}
