// Mail about the account itself. It names nobody: whoever types a stranger's address cannot make us deliver their words.
import { writeLetter } from './letter'
import type { Letter, MailWords } from './letter'

export interface LinkMail {
  /** Works once. */
  url: string
  /** "24 hours" */
  validFor: string
}

/** Sent after sign-up: nothing is told to an address that nobody confirmed. */
export function verifyAddressMail({ url, validFor }: LinkMail): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'Confirm your e-mail address for Nightsheet',
    heading: 'Confirm your e-mail address',
    paragraphs: [
      'Once it is confirmed, we can tell you when to fill, flood or hold off.',
      `The link works once, within ${validFor}.`,
    ],
    action: { label: 'Confirm this address', url },
    closing: [
      'If you did not sign up, leave this mail unanswered. Without your confirmation this address hears no more from us.',
    ],
    reason: 'You get this because someone signed up to Nightsheet with this address.',
  })
}

export function signInLinkMail({ url, validFor }: LinkMail): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'Your sign-in link for Nightsheet',
    heading: 'Sign in to Nightsheet',
    paragraphs: [`The link works once, within ${validFor}. Do not pass it on: whoever opens it is signed in as you.`],
    action: { label: 'Sign in', url },
    closing: [NOT_YOU],
    reason: 'You get this because a sign-in link was asked for with this address.',
  })
}

export function resetPasswordMail({ url, validFor }: LinkMail): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'Choose a new password for Nightsheet',
    heading: 'Choose a new password',
    paragraphs: [
      `The link works once, within ${validFor}. Your old password stays good until you have chosen a new one.`,
    ],
    action: { label: 'Choose a new password', url },
    closing: [NOT_YOU],
    reason: 'You get this because a new password was asked for with this address.',
  })
}

/** Sent when a known address signs up again: the page answers as it does for a new one, so it gives nobody away. */
export function addressAlreadyRegisteredMail({
  signInUrl,
  resetUrl,
}: {
  signInUrl: string
  resetUrl: string
}): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'You already have a Nightsheet account',
    heading: 'You already have an account',
    paragraphs: ['Someone signed up with this address just now. It has an account, so no second one was made.'],
    action: { label: 'Sign in', url: signInUrl },
    closing: ['If that was not you, there is nothing to do: your account is as it was.'],
    reason: 'You get this because someone signed up to Nightsheet with this address.',
    footLinks: [{ label: 'Choose a new password', url: resetUrl }],
  })
}

/** Goes to the new address: only its reader can make it the account's. */
export function changeAddressMail({ url, validFor }: LinkMail): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'Confirm your new e-mail address for Nightsheet',
    heading: 'Confirm your new address',
    paragraphs: [
      'Until it is confirmed, everything goes to the old address as before.',
      `The link works once, within ${validFor}.`,
    ],
    action: { label: 'Use this address', url },
    closing: [NOT_YOU],
    reason: 'You get this because somebody asked to use this address for their Nightsheet account.',
  })
}

/** Goes to the address that was left. It does not name the new one: it may be read by somebody else by now. */
export function addressChangedMail({ signInUrl }: { signInUrl: string }): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'Your Nightsheet account has a new e-mail address',
    heading: 'Your account has a new address',
    paragraphs: ['From now on everything goes to the new one. This address hears no more from us.'],
    action: { label: 'Sign in', url: signInUrl },
    closing: ['If you did not change it, somebody else has your password: tell whoever runs this server at once.'],
    reason: 'You get this because this was the address of a Nightsheet account until now.',
  })
}

/** @param on The day on which the account is deleted, in words. */
export function deletionAskedMail({ on, signInUrl }: { on: string; signInUrl: string }): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: `Your Nightsheet account will be deleted on ${on}`,
    heading: `Your account will be deleted on ${on}`,
    paragraphs: [
      'You asked us to delete it. Until then you can sign in and keep it; afterwards it is gone for good, with the rinks that only you keep.',
    ],
    action: { label: 'Sign in to keep it', url: signInUrl },
    closing: ['If you did not ask for this, sign in, keep the account and change its password.'],
    reason: 'You get this because the deletion of your Nightsheet account was asked for.',
  })
}

export function testMail({ accountUrl }: { accountUrl: string }): MailWords {
  return writeLetter({
    ...ACCOUNT_LETTER,
    subject: 'A test from Nightsheet',
    heading: 'This mail reached you',
    paragraphs: ['Word of a good night will come the same way.'],
    action: { label: 'Back to your account', url: accountUrl },
    closing: [],
    reason: 'You get this because you asked for a test on your account page.',
  })
}

const NOT_YOU = 'If you did not ask for this, there is nothing to do: nothing changes unless the link is opened.'

const ACCOUNT_LETTER: Pick<Letter, 'kicker' | 'lists' | 'footLinks'> = {
  kicker: 'Nightsheet',
  lists: [],
  footLinks: [],
}
