// The day to fill, as a mail and as a push. The words come finished.
import type { FillDayKind } from '@/lib/advice/fill-day-due'
import type { FillDayContent } from '@/lib/schemas/alert-content'
import type { PushWords } from './alerts'
import { writeLetter, type MailWords } from './letter'
import { pushBody, shortName, waysOut } from './rink-news'

export type FillDayWords = FillDayContent['words'] & { weekUrl: string; unsubscribeUrl: string; manageUrl: string }

const FRAMES: Record<FillDayKind, { subjectLead: string; pushTitle: string }> = {
  'fill-ahead': { subjectLead: '', pushTitle: 'a day to fill' },
  'fill-changed': { subjectLead: 'plan changed. ', pushTitle: 'the day to fill changed' },
  'fill-closed': { subjectLead: 'called off. ', pushTitle: 'hold off filling' },
}

/** @throws RangeError when a link is no web address. */
export function fillDayMail(kind: FillDayKind, words: FillDayWords): MailWords {
  const rinkName = shortName(words.rinkName)
  return writeLetter({
    subject: `${rinkName}: ${FRAMES[kind].subjectLead}${words.sentence.replace(/\.$/, '')}`,
    kicker: `${rinkName}, ${words.nightLabel}`,
    heading: words.sentence,
    paragraphs: [words.before, words.sure, words.plan, words.caveat],
    lists: [
      { title: 'Have ready', items: words.ready.map((text) => ({ text })) },
      { title: 'Take care', items: words.cautions.map((text) => ({ text })), isCaution: true },
    ],
    action: { label: 'Open the week', url: words.weekUrl },
    closing: ['Thickness is an estimate: drill and measure before anyone skates.'],
    reason: `You get this because you asked to be told about ${rinkName}.`,
    footLinks: waysOut(words),
  })
}

/** `tag` makes a newer notification take the place of an older one: the same for one rink. */
export function fillDayPush(kind: FillDayKind, words: FillDayWords, tag: string): PushWords {
  return {
    title: `${shortName(words.rinkName)}: ${FRAMES[kind].pushTitle}`,
    body: pushBody(words.sentence, words.sure, words.plan),
    url: words.weekUrl,
    tag,
  }
}
