// Becoming known, signing in, and getting back in. No answer here tells a visitor whether an address has an account.
import type { Db } from '@/db/knex'
import { consumeAccountLink, findGoodAccountLink, voidAccountLinks, type LinkPurpose } from '@/db/queries/account-links'
import { findInvitationTo } from '@/db/queries/invitations'
import { deleteSessionsOf } from '@/db/queries/sessions'
import {
  confirmEmail,
  findAccount,
  findEmail,
  findUserForSignIn,
  isOnAnyRink,
  putUnconfirmedUser,
  setPasswordHash,
} from '@/db/queries/users'
import { linkUrl, openLinkKey } from '@/lib/auth/account-links'
import { hashPassword, verifyPassword } from '@/lib/auth/passwords'
import type { OpenContext } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import type { MailRequestInput, NewPasswordByLinkInput, PasswordSignInInput, SignUpInput } from '@/lib/schemas/accounts'
import { promiseAlreadyRegistered, promiseLink } from './account-mail'
import { giveBackOnEmail, spendByVisitor, spendOnEmail } from './rate-limits'

export interface SignedIn {
  userId: string
  hasRink: boolean
  /** Its deletion was asked for, and may be taken back. */
  isLeaving: boolean
  /** Where an invitation to their address waits, for somebody without a rink. */
  invitationPath?: string
}

/** Links that sign in whoever presses them. */
type WayInPurpose = Exclude<LinkPurpose, 'change-email'>

/** One sentence for a wrong password, an unknown address and an unconfirmed one. */
export const SIGN_IN_REFUSED =
  'That did not work: the password is not right, or the address is not confirmed yet. If it is not, a new link is on its way.'

const LINK_REFUSED = 'This link has been used or has run out. Ask for a new one.'

/** Mails a link that confirms the address; somebody who is known already gets a mail that says so. */
export async function signUp(context: OpenContext, { email, name, password }: SignUpInput): Promise<void> {
  const { db, now } = context
  await spendByVisitor(context, 'signUpByVisitor')
  await spendOnEmail(context, { limit: 'mailByEmail', email, from: context.ipAddress })
  const passwordHash = await hashPassword(password)
  await db.transaction(async (trx) => {
    const user = await putUnconfirmedUser(trx, { email, name, passwordHash }, now)
    if (!user) return remindKnownUser(trx, email, now)
    // A link from an earlier sign-up would confirm a password that its reader may not have chosen.
    await voidAccountLinks(trx, user.id, now)
    await promiseLink(trx, user.id, 'verify', now)
  })
}

async function remindKnownUser(trx: Db, email: string, now: Date): Promise<void> {
  const known = await findUserForSignIn(trx, email)
  if (known) await promiseAlreadyRegistered(trx, known.id, now)
}

/** Mails a link that signs in or lets choose a new password, when there is somebody to mail it to. */
export async function requestLink(
  context: OpenContext,
  { email }: MailRequestInput,
  purpose: 'sign-in' | 'reset',
): Promise<void> {
  await spendByVisitor(context, 'mailByVisitor')
  await spendOnEmail(context, { limit: 'mailByEmail', email, from: context.ipAddress })
  const user = await findUserForSignIn(context.db, email)
  if (user) await context.db.transaction((trx) => promiseLink(trx, user.id, purpose, context.now))
}

/** @throws InvalidInputError in the same words and after the same work, whatever was wrong. */
export async function signInWithPassword(
  context: OpenContext,
  { email, password }: PasswordSignInInput,
): Promise<SignedIn> {
  await spendByVisitor(context, 'signInByVisitor')
  const attempt = { limit: 'signInByEmail', email, from: context.ipAddress } as const
  await spendOnEmail(context, attempt)
  const user = await findUserForSignIn(context.db, email)
  const matches = await verifyPassword(user?.passwordHash, password)
  if (user && matches && user.emailVerifiedAt) {
    await giveBackOnEmail(context, attempt)
    return signedIn(context, user.id)
  }
  if (user && matches) await resendConfirmation(context, user.id, email)
  throw new InvalidInputError(SIGN_IN_REFUSED)
}

async function resendConfirmation(context: OpenContext, userId: string, email: string): Promise<void> {
  await spendOnEmail(context, { limit: 'mailByEmail', email, from: context.ipAddress })
  await context.db.transaction((trx) => promiseLink(trx, userId, 'verify', context.now))
}

/** Whose account a link opens, without using it up; undefined when it no longer works. */
export async function findLinkOwner(
  { db, now, secret }: OpenContext,
  purpose: WayInPurpose,
  key: string,
): Promise<{ email: string } | undefined> {
  const link = openLinkKey(secret, purpose, key)
  const good = link && (await findGoodAccountLink(db, link, now))
  const email = good && (await findEmail(db, good.userId))
  return email ? { email } : undefined
}

/**
 * Confirms the address that the link was mailed to. The password typed at sign-up stays only where the link is opened in
 * the browser that signed up: elsewhere somebody else may have typed it.
 *
 * @param signedUpAs The address that this browser signed up with.
 * @throws InvalidInputError when the link no longer works.
 */
export function confirmAddress(context: OpenContext, key: string, signedUpAs: string | undefined): Promise<SignedIn> {
  return withLink(context, 'verify', key, async (trx, userId) => {
    const isFirstProof = await confirmEmail(trx, userId, context.now)
    const isSameBrowser = signedUpAs !== undefined && signedUpAs === (await findEmail(trx, userId))
    if (isFirstProof && !isSameBrowser) await setPasswordHash(trx, userId, null, context.now)
  })
}

/** @throws InvalidInputError when the link no longer works. */
export function signInWithLink(context: OpenContext, key: string): Promise<SignedIn> {
  return withLink(context, 'sign-in', key, async (trx, userId) => {
    const isFirstProof = await confirmEmail(trx, userId, context.now)
    // Whoever chose the password never showed that the mailbox is theirs; this person just did.
    if (isFirstProof) await setPasswordHash(trx, userId, null, context.now)
  })
}

/** Ends every session and every other link of the account. @throws InvalidInputError when the link no longer works. */
export async function resetPassword(
  context: OpenContext,
  { key, password }: NewPasswordByLinkInput,
): Promise<SignedIn> {
  // A forged key shall not make us hash.
  if (!openLinkKey(context.secret, 'reset', key)) throw new InvalidInputError(LINK_REFUSED)
  const passwordHash = await hashPassword(password)
  return withLink(context, 'reset', key, async (trx, userId) => {
    await confirmEmail(trx, userId, context.now)
    await setPasswordHash(trx, userId, passwordHash, context.now)
    await deleteSessionsOf(trx, userId)
    await voidAccountLinks(trx, userId, context.now)
  })
}

async function withLink(
  { db, now, secret }: OpenContext,
  purpose: WayInPurpose,
  key: string,
  work: (trx: Db, userId: string) => Promise<void>,
): Promise<SignedIn> {
  const link = openLinkKey(secret, purpose, key)
  if (!link) throw new InvalidInputError(LINK_REFUSED)
  return db.transaction(async (trx) => {
    const used = await consumeAccountLink(trx, link, now)
    if (!used) throw new InvalidInputError(LINK_REFUSED)
    await work(trx, used.userId)
    return signedIn({ db: trx, now, secret }, used.userId)
  })
}

type SigningIn = Pick<OpenContext, 'db' | 'now' | 'secret'>

async function signedIn(context: SigningIn, userId: string): Promise<SignedIn> {
  const account = await findAccount(context.db, userId)
  const hasRink = await isOnAnyRink(context.db, userId)
  const invitationPath = account && !hasRink ? await findInvitationPath(context, account.email) : undefined
  return { userId, hasRink, isLeaving: Boolean(account?.deletionDueAt), invitationPath }
}

/** The address is confirmed: its owner could as well open the mail that went there. */
async function findInvitationPath({ db, now, secret }: SigningIn, email: string): Promise<string | undefined> {
  const invitation = await findInvitationTo(db, email, now)
  return invitation && linkUrl('', secret, { id: invitation.id, purpose: 'invitation' })
}
