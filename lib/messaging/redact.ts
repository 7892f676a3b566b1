// What a mail or push server said, made fit for a log: no address, no secret link, one short line.

const LONGEST_REASON = 160

/** Servers like to repeat the address they refuse, and a push endpoint is a secret in itself. */
export function redactReason(text: string): string {
  return text
    .replace(/https?:\/\/[^\s"'<>]+/gi, '[link]')
    .replace(/<?[^\s<>"'(),;:]+@[^\s<>"'(),;]+>?/g, '[address]')
    .replace(/[\p{Cc}\s]+/gu, ' ')
    .trim()
    .slice(0, LONGEST_REASON)
}
