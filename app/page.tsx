// The front page: the job on one screen, and a sample night judged by the model itself.
import Link from 'next/link'
import { NightStrip } from '@/components/rinks/night-strip'
import { readerOf } from '@/components/rinks/reader'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { PageFrame } from '@/components/ui/page-frame'
import { maybeViewer } from '@/lib/auth/request-context'
import { sureSentence, verdictSentence } from '@/lib/words/night'
import { HelpLinks } from './_components/help-links'
import { sampleNight } from './_components/sample-night'
import { SamplePlan } from './_components/sample-plan'
import { WhatItDoes } from './_components/what-it-does'

export default async function FrontPage() {
  const viewer = await maybeViewer()
  return (
    <PageFrame>
      <p className="font-semibold">Nightsheet</p>
      <div className="items-end gap-x-14 lg:grid lg:grid-cols-2">
        <h1 className="mt-5 mb-3 text-verdict font-medium tracking-tight lg:text-verdict-wide">
          When to flood your rink tonight, from the weather of your own yard.
        </h1>
        <div className="mb-3">
          <p className="mb-4 max-w-line">
            A thermometer does not tell. A clear, dry night just above freezing can set a flood that a cloudy, damp
            night below it leaves wet. Nightsheet works out hour by hour how fast your water would freeze.
          </p>
          <Doors isSignedIn={viewer !== undefined} />
        </div>
      </div>
      <Sample />
      <WhatItDoes />
      <Notice tone="caution">
        <p>
          For ice on land only: it never calls ponds, lakes or rivers safe. Thickness is an estimate; drill and measure
          before anyone skates. Don’t flood alone.{' '}
          <Link href="/help/cautions" className="underline">
            All cautions
          </Link>
        </p>
      </Notice>
      <HelpLinks />
    </PageFrame>
  )
}

function Doors({ isSignedIn }: { isSignedIn: boolean }) {
  if (isSignedIn) {
    return (
      <ButtonLink look="main" href="/rinks">
        Open tonight
      </ButtonLink>
    )
  }
  return (
    <div className="flex flex-wrap gap-3">
      <ButtonLink look="main" href="/sign-up">
        Set up your rink
      </ButtonLink>
      <ButtonLink href="/sign-in">Sign in</ButtonLink>
    </div>
  )
}

function Sample() {
  const sample = sampleNight()
  const { summary, modelVersion } = sample.outlook
  const now = new Date(sample.readAt)
  const reader = readerOf(sample)
  return (
    <section aria-labelledby="sample" className="mt-6">
      <h2 id="sample" className="text-lead">
        {verdictSentence(summary, now, reader)}
      </h2>
      <p className="mb-3 text-note text-graphite">A sample night. {sureSentence(summary, reader)}</p>
      <div className="gap-x-9 xl:grid xl:grid-cols-[1fr_244px]">
        <NightStrip source={sample} now={now.getTime()} />
        <SamplePlan passes={summary.passes} reader={reader} />
      </div>
      <p className="mt-2 max-w-line text-small text-graphite">
        Invented weather for a yard near Pembroke, Ontario, judged here by {modelVersion}, the model that judges yours.
        Touch an hour to see its figures.
      </p>
    </section>
  )
}
