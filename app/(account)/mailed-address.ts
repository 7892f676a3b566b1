// Remembers for the next page where a mail went, in a cookie rather than in the address bar and its history.
import 'server-only'
import { cookies } from 'next/headers'
import { redirect } from 'next/navigation'

const NAME = 'nightsheet.mailed'
const PATH = '/check-your-mail'
const TEN_MINUTES_SECONDS = 600

/** Goes to the page that says where the mail went. */
export async function goToCheckYourMail(email: string, about: 'sign-up' | 'sign-in' | 'reset'): Promise<never> {
  const jar = await cookies()
  jar.set(NAME, email, { httpOnly: true, sameSite: 'lax', path: PATH, maxAge: TEN_MINUTES_SECONDS })
  redirect(`${PATH}?for=${about}`)
}

export async function readMailedAddress(): Promise<string | undefined> {
  return (await cookies()).get(NAME)?.value
}
