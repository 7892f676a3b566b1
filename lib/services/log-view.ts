// Entries as screens get them: no row leaves the services.
import type { LogEntry, Revision } from '@/db/queries/log-entries'
import type { EntryView } from '@/lib/schemas/log-choices'

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
