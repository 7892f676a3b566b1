// Another address for one's account: asked for by its owner, and confirmed by the same person from the mailbox it names.
import { consumeAccountLink, findGoodAccountLink, voidAccountLinks } from '@/db/queries/account-links'
import { changeEmail, findEmail, findUserForSignIn } from '@/db/queries/users'
import { openLinkKey } from '@/lib/auth/account-links'
import type { OpenContext, ServiceContext, Viewer } from '@/lib/context'
import { InvalidInputError } from '@/lib/errors'
import type { EmailChangeInput } from '@/lib/schemas/accounts'
import { promiseAddressChangedMail, promiseAlreadyRegistered, promiseLink } from './account-mail'
import { requireOwner } from './own-account'
import { spendOnEmail } from './rate-limits'

const LINK_REFUSED = 'This link has been used or has run out. Ask for a new one.'
const NOT_YOURS = 'Another account asked for this address. Sign in with that one, and open the link again.'

/**
 * Mails a link to the new address; until it is pressed the old one stays. An address that has an account gets a mail
 * that says so, and the page answers alike.
 */
export async function askForEmailChange(context: ServiceContext, input: EmailChangeInput): Promise<void> {
  const { db, now, viewer } = context
  await requireOwner(context, input.currentPassword)
  await spendOnEmail(context, { limit: 'mailByEmail', email: input.email, from: viewer.userId })
  const known = await findUserForSignIn(db, input.email)
  if (known?.id === viewer.userId) {
    throw new InvalidInputError('Nothing was changed.', { email: 'This is your address already.' })
  }
  await db.transaction(async (trx) => {
    if (known) await promiseAlreadyRegistered(trx, known.id, now)
    else await promiseLink(trx, viewer.userId, 'change-email', now, input.email)
  })
}

export type NewAddressView =
  | { state: 'dead' }
  /** Nobody is signed in here: whoever reads this mailbox may be somebody else, and learns nothing of the account. */
  | { state: 'stranger' }
  | { state: 'another-account' }
  | { state: 'open'; email: string; presentEmail: string }

/** What a link to a new address offers to whoever opens it, without using it up. */
export async function readNewAddress(
  { db, now, secret }: OpenContext,
  viewer: Viewer | undefined,
  key: string,
): Promise<NewAddressView> {
  const link = openLinkKey(secret, 'change-email', key)
  const good = link && (await findGoodAccountLink(db, link, now))
  const presentEmail = good && (await findEmail(db, good.userId))
  if (!good?.newEmail || !presentEmail) return { state: 'dead' }
  if (!viewer) return { state: 'stranger' }
  if (viewer.userId !== good.userId) return { state: 'another-account' }
  return { state: 'open', email: good.newEmail, presentEmail }
}

/**
 * Makes the address that the link was mailed to the account's, and tells the one before. Only for the person who asked:
 * the address may be mistyped, and whoever reads its mail a stranger.
 *
 * @throws InvalidInputError when the link no longer works or belongs to another account, which leaves it good.
 */
export async function takeNewAddress(
  { db, now, viewer, secret }: ServiceContext & Pick<OpenContext, 'secret'>,
  key: string,
): Promise<void> {
  const link = openLinkKey(secret, 'change-email', key)
  if (!link) throw new InvalidInputError(LINK_REFUSED)
  await db.transaction(async (trx) => {
    const used = await consumeAccountLink(trx, link, now)
    if (!used?.newEmail) throw new InvalidInputError(LINK_REFUSED)
    if (used.userId !== viewer.userId) throw new InvalidInputError(NOT_YOURS)
    const oldEmail = await findEmail(trx, viewer.userId)
    if (!(await changeEmail(trx, viewer.userId, used.newEmail, now))) throw new InvalidInputError(LINK_REFUSED)
    if (oldEmail) await promiseAddressChangedMail(trx, viewer.userId, oldEmail, now)
    await voidAccountLinks(trx, viewer.userId, now)
  })
}
