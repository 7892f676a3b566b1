// The pages that anybody may read, at the foot of the front page and of each other.
import Link from 'next/link'

const PAGES = [
  { href: '/how-it-works', word: 'How it works, how well, and where it stops' },
  { href: '/help/measuring', word: 'How to measure' },
  { href: '/help/cautions', word: 'Cautions' },
] as const

export function HelpLinks() {
  return (
    <nav aria-label="Help" className="mt-6 flex flex-wrap gap-x-7">
      {PAGES.map(({ href, word }) => (
        <Link key={href} href={href} className="inline-flex min-h-touch items-center underline">
          {word}
        </Link>
      ))}
    </nav>
  )
}
