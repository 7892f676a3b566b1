// Entries as screens get them, and who reads: no row leaves the services.
import type { LogEntry, Revision } from '@/db/queries/log-entries'
import { findAccount } from '@/db/queries/users'
import type { ServiceContext } from '@/lib/context'
import { NotFoundError } from '@/lib/errors'
import type { EntryView } from '@/lib/schemas/log-choices'
import { wordsFor, type WordOptions } from '@/lib/words/options'

const iso = (at: Date | string | null) => (at === null ? null : new Date(at).toISOString())

export function entryView(entry: LogEntry | Revision['was']): EntryView {
  return {
    id: entry.id,
    kind: entry.kind,
    happenedAt: new Date(entry.happenedAt).toISOString(),
    nightDate: entry.nightDate,
    layerMm: entry.layerMm,
    waterL: entry.waterL,
    waterTemperatureC: entry.waterTemperatureC,
    waterKind: entry.waterKind,
    thicknessMm: entry.thicknessMm,
    modelThicknessMm: entry.modelThicknessMm,
    saidSetByAt: iso(entry.saidSetByAt),
    outcome: entry.outcome,
    outcomeAt: iso(entry.outcomeAt),
    note: entry.note,
    by: entry.by,
    version: entry.version,
    isDeleted: entry.deletedAt !== null,
  }
}

/** How the viewer reads figures and times; times are the rink's. */
export async function readerOf({ db, viewer }: ServiceContext, timeZone: string): Promise<WordOptions> {
  const account = await findAccount(db, viewer.userId)
  if (!account) throw new NotFoundError('Account')
  return wordsFor(account, timeZone)
}
