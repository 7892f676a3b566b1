// What a link that no longer works shows, with the way to a new one.
import { ButtonLink } from '@/components/ui/button'
import { Title } from './title'

export function DeadLink({ href, again }: { href: '/sign-in' | '/reset'; again: string }) {
  return (
    <>
      <Title lead="A link works once and for a limited time. If you asked for several, only use the newest.">
        This link no longer works
      </Title>
      <ButtonLink href={href} look="main">
        {again}
      </ButtonLink>
    </>
  )
}
