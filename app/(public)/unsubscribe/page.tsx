// Where the unsubscribe link of a mail leads: one button, no sign-in. Opening the page changes nothing.
import type { Metadata } from 'next'
import { Button, ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { openContext } from '@/lib/auth/open-context'
import { AppError } from '@/lib/errors'
import { getMailChoice } from '@/lib/services/unsubscribe'

export const metadata: Metadata = { title: 'Mails about a rink', robots: { index: false } }

async function readChoice(token: unknown) {
  const context = await openContext()
  try {
    return await getMailChoice(context, context.secret, token)
  } catch (error) {
    if (error instanceof AppError) return { refusal: error.message }
    throw error
  }
}

export default async function UnsubscribePage({ searchParams }: PageProps<'/unsubscribe'>) {
  const { token } = await searchParams
  const choice = await readChoice(token)
  return (
    <PageFrame>
      <div className="max-w-line">
        {'refusal' in choice ? <Broken message={choice.refusal} /> : <Choice {...choice} token={String(token)} />}
      </div>
    </PageFrame>
  )
}

function Title({ children }: { children: string }) {
  return <h1 className="mb-3 max-w-[24ch] text-verdict font-medium lg:text-verdict-wide">{children}</h1>
}

function Broken({ message }: { message: string }) {
  return (
    <>
      <Title>This link does not work.</Title>
      <p className="mb-5">{message} Nothing was changed.</p>
      <ButtonLink href="/rinks">My rinks</ButtonLink>
    </>
  )
}

function Choice({ rinkName, wantsEmail, token }: { rinkName: string | null; wantsEmail: boolean; token: string }) {
  const about = rinkName ? `about ${rinkName}` : 'about this rink'
  if (!wantsEmail) {
    return (
      <>
        <Title>{`Mails ${about} are off.`}</Title>
        <p className="mb-5">
          {rinkName
            ? 'Notifications on your devices stay as they were. Under Alerts you can switch mails on again.'
            : 'You are no longer on its list.'}
        </p>
        <ButtonLink href="/rinks">My rinks</ButtonLink>
      </>
    )
  }
  return (
    <>
      <Title>{`Stop mails ${about}?`}</Title>
      <p className="mb-5">
        You will get no more mails about when to flood it. Notifications on your devices stay as they are.
      </p>
      <form method="post" action={`/api/unsubscribe?${new URLSearchParams({ token, from: 'page' })}`}>
        <Button type="submit" look="main">
          Stop these mails
        </Button>
      </form>
    </>
  )
}
