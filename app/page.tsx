// The front page: the job on one screen, and a sample night judged by the model itself.
import Link from 'next/link'
import { NightStrip } from '@/components/rinks/night-strip'
import { readerOf } from '@/components/rinks/reader'
import { Cautions } from '@/components/rinks/cautions'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { maybeViewer } from '@/lib/auth/request-context'
import { verdictSentence } from '@/lib/words/night'
import { sampleNight } from './_components/sample-night'

/** Those that hold every night, for people who have no rink here yet. */
const STANDING_CAUTIONS = ['land_only', 'thickness_is_estimate', 'not_alone', 'electric_leads'].map((code) => ({
  code,
  values: {},
}))

export default async function FrontPage() {
  const viewer = await maybeViewer()
  const sample = sampleNight()
  const { summary } = sample.outlook
  const now = new Date(sample.readAt)
  const reader = readerOf(sample)
  return (
    <PageFrame>
      <p className="font-semibold">Nightsheet</p>
      <h1 className="mt-6 mb-3 max-w-[26ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        When to flood your rink tonight, from the weather of your own yard.
      </h1>
      <p className="mb-5 max-w-line">
        A thermometer does not tell. A clear, dry night just above freezing can set a flood that a cloudy, damp night
        below it leaves wet. Nightsheet works out hour by hour how fast water would freeze on your sheet, plans the
        passes, and tells you in the afternoon.
      </p>
      <div className="mb-8 flex flex-wrap gap-3">
        {viewer ? (
          <ButtonLink look="main" href="/rinks">
            Open tonight
          </ButtonLink>
        ) : (
          <>
            <ButtonLink look="main" href="/sign-up">
              Set up your rink
            </ButtonLink>
            <ButtonLink href="/sign-in">Sign in</ButtonLink>
          </>
        )}
      </div>
      <h2 className="mb-2 font-semibold">A sample night</h2>
      <p className="mb-4 max-w-line text-lead">{verdictSentence(summary, now, reader)}</p>
      <NightStrip source={sample} now={now.getTime()} />
      <p className="mt-2 mb-8 max-w-line text-note text-graphite">
        Invented weather for a yard near Pembroke, Ontario, judged by the model that judges yours. Touch an hour to see
        its figures.
      </p>
      <Cautions cautions={STANDING_CAUTIONS} reader={reader} />
      <p className="max-w-line">
        <Link href="/how-it-works" className="inline-flex min-h-touch items-center underline">
          How it works, what it rests on and where it stops
        </Link>
      </p>
    </PageFrame>
  )
}
