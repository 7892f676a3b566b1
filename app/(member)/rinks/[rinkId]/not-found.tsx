// A rink that does not exist, and one that is not yours, look the same.
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'

export default function RinkNotFound() {
  return (
    <PageFrame>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium lg:text-verdict-wide">There is no such rink here.</h1>
      <p className="mb-5 max-w-line">
        The address may be mistyped, or you are not on this rink’s list. Its keeper can add you.
      </p>
      <ButtonLink href="/rinks" look="main">
        My rinks
      </ButtonLink>
    </PageFrame>
  )
}
