// Values that come from people, made fit for a subject, a notification and a link.

/** One line without control or direction characters: a rink's name can add no header and turn no text around. */
export function oneLine(text: string): string {
  return text
    .replace(/[\u202A-\u202E\u2066-\u2069]/g, '')
    .replace(/[\p{Cc}\p{Zl}\p{Zp}\s]+/gu, ' ')
    .trim()
}

/** Cut between words, with an ellipsis, to at most so many characters. */
export function cutPolitely(text: string, longest: number): string {
  if (text.length <= longest) return text
  const cut = text.slice(0, longest - 1)
  const lastSpace = cut.lastIndexOf(' ')
  const words = lastSpace > longest / 2 ? cut.slice(0, lastSpace) : cut.replace(/[\uD800-\uDBFF]$/, '')
  return `${words.replace(/[\s,;:.–-]+$/, '')}…`
}

/** @throws RangeError for anything but a web address: no link of ours runs a script. */
export function webAddress(text: string): string {
  const url = URL.canParse(text) ? new URL(text) : undefined
  if (url?.protocol !== 'https:' && url?.protocol !== 'http:')
    throw new RangeError('A link in a message must be a web address.')
  return url.href
}
