// The words of an alert, finished when it is decided, in the person's units and clock.
import type { AlertRecipient } from '@/db/queries/alert-preferences'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { AlertContent } from '@/lib/schemas/alert-content'
import { cautionText } from '@/lib/words/cautions'
import { sureSentence, verdictSentence } from '@/lib/words/night'
import { nightLabel } from '@/lib/words/night-label'
import { wordsFor } from '@/lib/words/options'
import { passLine } from '@/lib/words/pass'
import { whyList } from '@/lib/words/why'

/** The footer of the mail says it already. */
const SAID_ANYWAY = 'thickness_is_estimate'

export function alertContent(
  { rink, summary, person }: { rink: RinkForJudging; summary: NightSummary; person: AlertRecipient },
  now: Date,
): AlertContent {
  const words = wordsFor(person, rink.timeZone)
  return {
    rinkId: rink.id,
    nightDate: summary.nightDate,
    words: {
      rinkName: rink.name,
      nightLabel: nightLabel(summary.nightDate),
      sentence: verdictSentence(summary, now, words),
      sure: sureSentence(summary, words),
      passes: summary.passes.map((pass) => passLine(pass, words)),
      cautions: summary.cautions
        .filter(({ code }) => code !== SAID_ANYWAY)
        .map((caution) => cautionText(caution, words)),
      why: whyList(summary.why, words).map(({ label, detail, figure }) => `${label} ${detail} ${figure}`),
    },
  }
}
