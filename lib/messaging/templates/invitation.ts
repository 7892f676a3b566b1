// The mail that invites somebody to a rink. The names are people's own words: short, and never a link.
import { writeLetter, type MailWords } from './letter'
import { oneLine } from './plain'
import { shortName } from './rink-news'

export interface InvitationWords {
  rinkName: string
  inviterName: string
  /** "as crew" */
  asRole: string
  /** "be told of good nights and write the log" */
  can: string
  /** "14 days" */
  validFor: string
  url: string
}

/** The dot between two letters would make mail programs see a web address in a name. */
const plainName = (name: string) => shortName(oneLine(name).replace(/[./:@]+(?=\S)/g, ' '))

/** @throws RangeError when the link is no web address. */
export function invitationMail({ asRole, can, validFor, url, ...names }: InvitationWords): MailWords {
  const [rinkName, inviterName] = [plainName(names.rinkName), plainName(names.inviterName)]
  return writeLetter({
    subject: `${inviterName} invites you to ${rinkName}`,
    kicker: `${rinkName}, on Nightsheet`,
    heading: `Join ${rinkName} ${asRole}`,
    paragraphs: [
      `${inviterName} keeps an outdoor rink with Nightsheet, which says when to fill, flood or hold off, and invites you to it.`,
      `You could ${can}.`,
      `The link works once, within ${validFor}. It asks before anything happens.`,
    ],
    lists: [],
    action: { label: 'See the invitation', url },
    closing: [`If you do not know ${inviterName}, leave this mail unanswered: nothing happens then.`],
    reason: `You get this because ${inviterName} typed this address to invite you.`,
    footLinks: [],
  })
}
