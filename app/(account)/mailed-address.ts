// Remembers for the next page where a mail went, and where to go once its link was opened: in cookies rather than in the
// address bar and its history, or in a mail.
import 'server-only'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'
import { localPath } from '@/lib/auth/next-path'

const NAME = 'nightsheet.mailed'
const PATH = '/check-your-mail'
const TEN_MINUTES_SECONDS = 600
const SIGNED_UP = 'nightsheet.signed-up'
const COME_BACK = 'nightsheet.come-back'
const DAY_SECONDS = 24 * 60 * 60

/** Goes to the page that says where the mail went. @param next Where to go once the mailed link was opened here. */
export async function goToCheckYourMail(
  email: string,
  about: 'sign-up' | 'sign-in' | 'reset',
  next?: string,
): Promise<never> {
  const jar = await cookies()
  const path = localPath(next)
  if (path) jar.set(COME_BACK, path, { httpOnly: true, sameSite: 'lax', path: '/', maxAge: DAY_SECONDS })
  else jar.delete(COME_BACK)
  jar.set(NAME, email, { httpOnly: true, sameSite: 'lax', path: PATH, maxAge: TEN_MINUTES_SECONDS })
  if (about === 'sign-up') {
    jar.set(SIGNED_UP, email, { httpOnly: true, sameSite: 'lax', path: '/verify', maxAge: DAY_SECONDS })
  }
  redirect(`${PATH}?for=${about}`)
}

export async function readMailedAddress(): Promise<string | undefined> {
  return (await cookies()).get(NAME)?.value
}

/** The address that this browser signed up with, while its link is good. */
export async function readSignedUpAddress(): Promise<string | undefined> {
  return (await cookies()).get(SIGNED_UP)?.value
}

/** Where this browser was on its way to when it asked for a link, once. The caller checks that it is a path of this site. */
export async function takeComeBackPath(): Promise<string | undefined> {
  const jar = await cookies()
  const path = jar.get(COME_BACK)?.value
  jar.delete(COME_BACK)
  return path
}
