// What is said about a night: as a mail and as a push. The words come finished; here they are only laid out.
import { writeLetter } from './letter'
import type { MailWords } from './letter'
import { pushBody, shortName, waysOut } from './rink-news'

export type AlertKind = 'flood-tonight' | 'flood-changed' | 'flood-closed' | 'thaw-ahead'

export interface AlertWords {
  rinkName: string
  /** "Tue 12 to Wed 13 January" */
  nightLabel: string
  /** The verdict: "Flood tonight between 8 pm and 1 am." */
  sentence: string
  /** "9 of 10 forecast runs agree." */
  sure: string
  passes: { at: string; what: string }[]
  cautions: string[]
  why?: string[]
  tonightUrl: string
  unsubscribeUrl: string
  manageUrl: string
}

export interface PushWords {
  title: string
  body: string
  url: string
  tag: string
}

interface Frame {
  /** Before the verdict in the subject, when the verdict alone would mislead. */
  subjectLead: string
  /** Before the verdict in the mail. */
  opening: string
  pushTitle: (rinkName: string) => string
}

const FRAMES: Record<AlertKind, Frame> = {
  'flood-tonight': { subjectLead: '', opening: '', pushTitle: (rinkName) => `${rinkName} tonight` },
  'flood-changed': {
    subjectLead: 'plan changed. ',
    opening: 'The plan for this night has changed. This takes the place of what we told you before.',
    pushTitle: (rinkName) => `${rinkName}: plan changed`,
  },
  'flood-closed': {
    subjectLead: 'called off. ',
    opening: 'The window for this night has closed. What we told you before no longer holds.',
    pushTitle: (rinkName) => `${rinkName}: called off`,
  },
  'thaw-ahead': { subjectLead: '', opening: '', pushTitle: (rinkName) => `${rinkName}: thaw` },
}

/** @throws RangeError when a link is no web address. */
export function alertMail(kind: AlertKind, words: AlertWords): MailWords {
  const { subjectLead, opening } = FRAMES[kind]
  const rinkName = shortName(words.rinkName)
  return writeLetter({
    subject: `${rinkName}: ${subjectLead}${words.sentence.replace(/\.$/, '')}`,
    kicker: `${rinkName}, ${words.nightLabel}`,
    heading: words.sentence,
    paragraphs: [opening, words.sure],
    lists: [
      { title: 'The plan', items: words.passes.map(({ at, what }) => ({ lead: at, text: what })) },
      { title: 'Take care', items: words.cautions.map((text) => ({ text })), isCaution: true },
      { title: 'Why', items: (words.why ?? []).map((text) => ({ text })) },
    ],
    action: { label: 'Open the night sheet', url: words.tonightUrl },
    closing: ['Thickness is an estimate: drill and measure before anyone skates.'],
    reason: `You get this because you asked to be told about ${rinkName}.`,
    footLinks: waysOut(words),
  })
}

/** `tag` makes a newer notification take the place of an older one: the same for one rink and night. */
export function alertPush(kind: AlertKind, words: AlertWords, tag: string): PushWords {
  return {
    title: FRAMES[kind].pushTitle(shortName(words.rinkName)),
    body: pushBody(words.sentence, words.sure),
    url: words.tonightUrl,
    tag,
  }
}
