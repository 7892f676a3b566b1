// Frame of everything that needs an account: navigation and the service worker. Access is decided by each page's service.
import type { ReactNode } from 'react'
import { pageContext } from '@/lib/auth/request-context'
import { listMyRinks } from '@/lib/services/rinks'
import { Navigation } from './_components/navigation'
import { ServiceWorker } from './_components/service-worker'

export default async function MemberLayout({ children }: { children: ReactNode }) {
  const rinks = await listMyRinks(await pageContext())
  return (
    <>
      <div className="lg:pl-[164px] print:p-0">{children}</div>
      <Navigation rinks={rinks.map(({ id, role }) => ({ id, role }))} />
      <ServiceWorker />
    </>
  )
}
