// Which answer of a mail server means that the address is dead.

/**
 * Whether the reply to RCPT TO refuses the mailbox itself. Only that may disable an address: a refused password,
 * sender or text is our fault and is tried again. Codes: RFC 5321 section 4.2.3 and RFC 7504; enhanced ones:
 * RFC 3463 sections 3.2 and 3.3, of which 5.1.7 and 5.1.8 speak of the sender and 5.2.2 of a full mailbox.
 */
export function isDeadMailbox(response: string): boolean {
  const [, code = '', enhanced] = /^(\d{3})[ -](?:(\d\.\d{1,3}\.\d{1,3})\b)?/.exec(response) ?? []
  if (!code.startsWith('5')) return false
  if (enhanced) return /^5\.(1\.(?!7$|8$)\d+|2\.1)$/.test(enhanced)
  return ['521', '550', '551', '553', '556'].includes(code)
}
