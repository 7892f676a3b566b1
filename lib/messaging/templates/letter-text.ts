// The plain text of a letter.
import type { Letter, LetterList } from './letter'

export function letterText(letter: Letter): string {
  const { kicker, heading, paragraphs, lists, action, closing, reason, footLinks } = letter
  return [
    kicker,
    [heading, ...paragraphs].join('\n'),
    ...lists.map(listText),
    `${action.label}:\n${action.url}`,
    closing.join('\n'),
    ['--', reason, ...footLinks.map(({ label, url }) => `${label}: ${url}`)].join('\n'),
  ]
    .filter(Boolean)
    .join('\n\n')
    .concat('\n')
}

function listText({ title, items }: LetterList): string {
  const lines = items.map(({ lead, text }) => (lead ? `- ${lead}: ${text}` : `- ${text}`))
  return [title, ...lines].join('\n')
}
