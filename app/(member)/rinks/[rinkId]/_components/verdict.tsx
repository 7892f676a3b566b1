// The verdict as one sentence, and how sure it is.
import { readerOf } from '@/components/rinks/quantities'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { nightWords } from './night-words'

const LEAD = /^(Flood|Fill) tonight/

export function Verdict({ view }: { view: TonightView }) {
  const { sentence, sure } = nightWords(view, readerOf(view))
  const lead = LEAD.exec(sentence)?.[0] ?? ''
  return (
    <>
      <h1 className="mt-7 mb-2 max-w-[22ch] text-verdict font-medium tracking-tight lg:max-w-[24ch] lg:text-verdict-wide">
        {lead ? (
          <em className={`font-semibold not-italic ${lead.startsWith('Flood') ? 'text-lamp-text' : 'text-hose'}`}>
            {lead}
          </em>
        ) : null}
        {sentence.slice(lead.length)}
      </h1>
      {sure ? <p className="mb-5 max-w-[60ch] text-graphite">{sure}</p> : null}
    </>
  )
}
