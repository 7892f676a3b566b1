// The reminder to look after a running hose, as a mail and as a push. The words come finished.
import type { PushWords } from './alerts'
import { writeLetter, type MailWords } from './letter'
import { pushBody, shortName, waysOut } from './rink-news'

export interface FillCheckWords {
  rinkName: string
  /** "Look at hose and liner." */
  sentence: string
  /** "About 5,400 L should be in by now." */
  progress: string
  cautions: string[]
  fillingUrl: string
  unsubscribeUrl: string
  manageUrl: string
}

/** @throws RangeError when a link is no web address. */
export function fillCheckMail(words: FillCheckWords): MailWords {
  const rinkName = shortName(words.rinkName)
  return writeLetter({
    subject: `${rinkName}: ${words.sentence.replace(/\.$/, '')}`,
    kicker: `${rinkName}, filling`,
    heading: words.sentence,
    paragraphs: [words.progress],
    lists: [{ title: 'Take care', items: words.cautions.map((text) => ({ text })), isCaution: true }],
    action: { label: 'Log what you saw', url: words.fillingUrl },
    closing: [],
    reason: `You get this because you look after the fill of ${rinkName}. A look that is logged, or a pause, ends it.`,
    footLinks: waysOut(words),
  })
}

export function fillCheckPush({ rinkName, sentence, progress, fillingUrl }: FillCheckWords, tag: string): PushWords {
  return {
    title: `${shortName(rinkName)}: the hose runs`,
    body: pushBody(sentence, progress),
    url: fillingUrl,
    tag,
  }
}
