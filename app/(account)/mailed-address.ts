// Remembers for the next page where a mail went, in a cookie rather than in the address bar and its history.
import 'server-only'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'

const NAME = 'nightsheet.mailed'
const PATH = '/check-your-mail'
const TEN_MINUTES_SECONDS = 600
const SIGNED_UP = 'nightsheet.signed-up'
const DAY_SECONDS = 24 * 60 * 60

/** Goes to the page that says where the mail went. */
export async function goToCheckYourMail(email: string, about: 'sign-up' | 'sign-in' | 'reset'): Promise<never> {
  const jar = await cookies()
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
