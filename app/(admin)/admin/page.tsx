// How this server does: jobs, weather, deliveries. For the admin alone.
import type { Metadata } from 'next'
import Link from 'next/link'
import { DataTable } from '@/components/ui/data-table'
import { Facts } from '@/components/ui/facts'
import { Notice } from '@/components/ui/notice'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getServerState } from '@/lib/services/server-state'

export const metadata: Metadata = { title: 'This server' }

const minuteText = (at: string | Date | null) =>
  at === null ? 'never' : `${new Date(at).toISOString().slice(0, 16).replace('T', ' ')} UTC`

const ageText = (minutes: number | null) => (minutes === null ? 'none' : `${minutes} min old`)

export default async function ServerPage() {
  const { health, failingCells, recentFailures } = await orNotFound(getServerState(await pageContext()))
  return (
    <PageFrame>
      <h1 className="mb-4 text-verdict font-medium tracking-tight">
        {health.status === 'ok' ? 'This server does its job.' : 'This server needs a look.'}
      </h1>
      {health.troubles.map((trouble) => (
        <Notice key={trouble} tone="caution">
          {trouble}
        </Notice>
      ))}
      <Facts
        rows={[
          { name: 'Workers', figure: String(health.workers) },
          { name: 'Rinks in season', figure: String(health.rinksInSeason) },
          { name: 'Newest forecast', figure: ageText(health.newestForecastAgeMinutes) },
          { name: 'Messages given up in a day', figure: String(health.deadMessages) },
        ]}
      />
      <h2 className="mt-8 mb-2 font-semibold">Jobs</h2>
      <DataTable
        caption="When each kind of job last began, ended well and failed"
        columns={[{ head: 'Job' }, { head: 'Began' }, { head: 'Ended well' }, { head: 'Failed' }]}
        rows={health.jobs.map((job) => ({
          key: job.job,
          cells: [
            job.job,
            minuteText(job.lastStartedAt),
            minuteText(job.lastSucceededAt),
            job.lastFailedAt ? `${minuteText(job.lastFailedAt)}: ${job.lastError}` : 'never',
          ],
        }))}
      />
      <h2 className="mt-8 mb-2 font-semibold">Weather that could not be read</h2>
      {failingCells.length === 0 ? <p className="text-graphite">None: every cell answered its last request.</p> : null}
      {failingCells.length > 0 ? (
        <DataTable
          caption="Cells whose last request failed"
          columns={[{ head: 'Cell' }, { head: 'Again at' }, { head: 'Fault' }]}
          rows={failingCells.map((cell) => ({
            key: `${cell.latitudeDeg}, ${cell.longitudeDeg}`,
            cells: [`${cell.latitudeDeg}, ${cell.longitudeDeg}`, minuteText(cell.retryAt), cell.lastError],
          }))}
        />
      ) : null}
      <h2 className="mt-8 mb-2 font-semibold">Deliveries that failed</h2>
      {recentFailures.length === 0 ? <p className="text-graphite">None.</p> : null}
      {recentFailures.length > 0 ? (
        <DataTable
          caption="The newest failed deliveries"
          columns={[{ head: 'When' }, { head: 'What' }, { head: 'Fault' }]}
          rows={recentFailures.map((failure, index) => ({
            key: String(index),
            cells: [
              minuteText(failure.attemptedAt),
              `${failure.kind} by ${failure.channel}, ${failure.outcome}`,
              failure.error ?? '',
            ],
          }))}
        />
      ) : null}
      <p className="mt-8">
        <Link href="/account" className="inline-flex min-h-touch items-center">
          Your account
        </Link>
      </p>
    </PageFrame>
  )
}
