// A letter as parts, from which the text and the HTML are both made, so that the two cannot tell different stories.
import { letterHtml } from './letter-html'
import { letterText } from './letter-text'
import { cutPolitely, oneLine, webAddress } from './plain'

export interface MailWords {
  subject: string
  text: string
  html: string
}

export interface Link {
  label: string
  url: string
}

export interface LetterList {
  title: string
  /** `lead` stands first and bold: a time. */
  items: { lead?: string; text: string }[]
  isCaution?: boolean
}

export interface Letter {
  subject: string
  /** Small, above the heading: which rink, which night. */
  kicker: string
  heading: string
  paragraphs: string[]
  lists: LetterList[]
  action: Link
  /** Below the action, for what must be said once more. */
  closing: string[]
  /** Why the reader gets this. */
  reason: string
  /** In the foot: how to stop or change it. */
  footLinks: Link[]
}

const LONGEST_SUBJECT = 140

/** @throws RangeError when a link is no web address. */
export function writeLetter(letter: Letter): MailWords {
  const clean = cleanLetter(letter)
  return { subject: clean.subject, text: letterText(clean), html: letterHtml(clean) }
}

/** Every line really is one, every link a web address; what is empty is left out. */
function cleanLetter(letter: Letter): Letter {
  const cleanLink = ({ label, url }: Link) => ({ label: oneLine(label), url: webAddress(url) })
  return {
    subject: cutPolitely(oneLine(letter.subject), LONGEST_SUBJECT),
    kicker: oneLine(letter.kicker),
    heading: oneLine(letter.heading),
    paragraphs: letter.paragraphs.map(oneLine).filter(Boolean),
    lists: letter.lists.map(cleanList).filter(({ items }) => items.length > 0),
    action: cleanLink(letter.action),
    closing: letter.closing.map(oneLine).filter(Boolean),
    reason: oneLine(letter.reason),
    footLinks: letter.footLinks.map(cleanLink),
  }
}

function cleanList({ title, items, isCaution }: LetterList): LetterList {
  const cleanItems = items.map(({ lead, text }) => ({ lead: lead && oneLine(lead), text: oneLine(text) }))
  return { title, isCaution, items: cleanItems.filter(({ text }) => text) }
}
