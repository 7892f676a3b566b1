// The end of an account: when it is due, and what goes with it.
import type { Db } from '@/db/knex'

/** `null` keeps the account after all. */
export async function setDeletionDue(db: Db, userId: string, dueAt: Date | null, now: Date): Promise<void> {
  await db('users').where({ id: userId }).update({ deletion_due_at: dueAt, updated_at: now })
}

/** Rinks that nobody else keeps: they go with the account. */
export async function listRinksKeptAlone(db: Db, userId: string): Promise<{ id: string; name: string }[]> {
  return db('rink_members as m')
    .join('rinks as r', 'r.id', 'm.rink_id')
    .where({ 'm.user_id': userId, 'm.role': 'keeper' })
    .whereNotExists(
      db('rink_members as k')
        .select(db.raw('1'))
        .whereRaw(`k.rink_id = m.rink_id and k.role = 'keeper' and k.user_id <> m.user_id`),
    )
    .orderBy(['r.name', 'r.id'])
    .select({ id: 'r.id', name: 'r.name' })
}

/** Accounts whose time is up, with the rinks that only they keep; what they wrote in others' logs stays, unnamed. */
export async function deleteDueAccounts(db: Db, now: Date): Promise<number> {
  const due = await db('users').where('deletion_due_at', '<=', now).orderBy('id').select('id')
  let deleted = 0
  for (const { id } of due) deleted += await db.transaction((trx) => deleteDueAccount(trx, id, now))
  return deleted
}

async function deleteDueAccount(trx: Db, userId: string, now: Date): Promise<number> {
  // The rinks' locks first, as when somebody leaves: a keeper who leaves at this moment is gone, or knows that this one is.
  await trx('rinks')
    .whereIn('id', trx('rink_members').where({ user_id: userId }).select('rink_id'))
    .orderBy('id')
    .forNoKeyUpdate()
    .select('id')
  // They may have come back and kept it meanwhile.
  const [due] = await trx('users').where({ id: userId }).where('deletion_due_at', '<=', now).forUpdate().select('id')
  if (!due) return 0
  const alone = await listRinksKeptAlone(trx, userId)
  await trx('rinks')
    .whereIn(
      'id',
      alone.map(({ id }) => id),
    )
    .delete()
  return trx('users').where({ id: userId }).delete()
}
