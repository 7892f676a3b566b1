// After anything that sends a link: the same page whether or not the address has an account.
import type { Metadata } from 'next'
import Link from 'next/link'
import { Title } from '../_components/title'
import { readMailedAddress } from '../mailed-address'

export const metadata: Metadata = { title: 'Check your mail' }

const PURPOSES = {
  'sign-up': { why: 'It confirms your address and signs you in. It works for 24 hours.', again: '/sign-up' },
  'sign-in': { why: 'It signs you in, once, within 30 minutes.', again: '/sign-in' },
  reset: { why: 'It lets you choose a new password within 30 minutes.', again: '/reset' },
} as const

export default async function CheckYourMailPage({ searchParams }: PageProps<'/check-your-mail'>) {
  const { for: about } = await searchParams
  const { why, again } = about === 'sign-up' || about === 'reset' ? PURPOSES[about] : PURPOSES['sign-in']
  const address = await readMailedAddress()
  return (
    <>
      <Title>Check your mail</Title>
      <p>
        We sent a link to <span className="font-medium break-words">{address ?? 'your address'}</span>.
      </p>
      <p className="mt-2 text-graphite">{why}</p>
      <p className="mt-8 border-t border-rule pt-4 text-note text-graphite">
        Nothing there after a few minutes? Look among the unwanted mail, check the spelling of the address, and{' '}
        <Link href={again} className="py-3 text-ink underline">
          try again
        </Link>
        .
      </p>
    </>
  )
}
