// Which replies of a mail server disable an address. Meanings: RFC 3463 sections 3.2, 3.3 and 3.8, RFC 5321, RFC 7504.
import { expect, test } from 'vitest'
import { isDeadMailbox } from '@/lib/messaging/smtp-replies'

test.each([
  ['550 5.1.1 no such user', 'bad mailbox'],
  ['550 5.1.2 no such domain', 'bad system'],
  ['556 5.1.10 null MX', 'domain takes no mail'],
  ['550 5.2.1 disabled', 'mailbox disabled'],
  ['550 no such user', 'no enhanced code'],
  ['550-5.1.1 no such user\r\n550 5.1.1 see help', 'several lines'],
  ['521 host takes no mail', 'no enhanced code'],
])('%s: dead (%s)', (reply) => {
  expect(isDeadMailbox(reply)).toBe(true)
})

test.each([
  ['451 4.7.1 greylisted', 'come back later'],
  ['450 4.2.1 busy', 'come back later'],
  ['552 5.2.2 full', 'may be emptied'],
  ['550 5.1.7 bad sender', 'about us'],
  ['550 5.1.8 sender domain unknown', 'about us'],
  ['550 5.7.1 blocked', 'policy, about us'],
  ['554 refused', 'policy, no enhanced code'],
  ['503 out of order', 'protocol'],
  ['', 'silence'],
])('%s: not dead (%s)', (reply) => {
  expect(isDeadMailbox(reply)).toBe(false)
})
