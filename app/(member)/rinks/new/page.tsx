// Setting up a rink: name and place are asked, everything else has a starting value.
import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import { newRinkValues } from '@/components/rinks/form/values'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { listMyRinks } from '@/lib/services/rinks'
import { SetUpForm } from './_components/set-up-form'

export const metadata: Metadata = { title: 'Set up a rink' }

export default async function NewRinkPage() {
  const context = await pageContext()
  const { units, email } = await orNotFound(getAccount(context))
  const isFirst = (await listMyRinks(context)).length === 0
  return (
    <PageFrame>
      <div className="max-w-[34rem]">
        <h1 className="mb-2 text-verdict font-medium lg:text-verdict-wide">Set up a rink</h1>
        <p className="max-w-line">
          We need its name and where it is. Everything else has a starting value that you can change now or later.
        </p>
        <SetUpForm initial={newRinkValues(units, randomUUID())} email={email} isFirst={isFirst} />
      </div>
    </PageFrame>
  )
}
