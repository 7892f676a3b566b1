// Everything of one's account as one document to take along.
import { readAccountForExport } from '@/db/queries/account-export'
import type { ServiceContext } from '@/lib/context'
import { spend } from './rate-limits'

/** Names of fields are those of the database; instants are ISO text in UTC. */
export async function exportAccount(context: ServiceContext): Promise<Record<string, unknown>> {
  await spend(context, 'exportByUser', context.viewer.userId)
  return { writtenAt: context.now.toISOString(), ...(await readAccountForExport(context.db, context.viewer.userId)) }
}
