// The factors a rink is judged with: what its reports have taught, else what its keeper set.
import type { RinkForJudging } from '@/db/queries/rinks'
import { findYardEstimate } from '@/db/queries/yards'
import type { Db } from '@/db/knex'
import { MODEL_VERSION } from '@/lib/advice/judge'
import type { Yard } from '@/lib/advice/yard/types'
import { shelterFactor } from '@/lib/physics/site'

/** Less than this is the same factor. Ours. */
const LEAST_CHANGE = 0.01

/** What the keeper set: believed before any report. */
export function priorOf(rink: Pick<RinkForJudging, 'shelter' | 'skyView'>): Yard {
  return { shelter: shelterFactor(rink.shelter), skyView: rink.skyView }
}

export function isSameYard(one: Yard, other: Yard): boolean {
  return Math.abs(one.shelter - other.shelter) < LEAST_CHANGE && Math.abs(one.skyView - other.skyView) < LEAST_CHANGE
}

/** What was learned counts until the keeper sets the yard differently, or the model changes. */
export async function findYardInUse(db: Db, rink: RinkForJudging): Promise<Yard> {
  const prior = priorOf(rink)
  const estimate = await findYardEstimate(db, rink.id)
  if (!estimate?.learned.isLearned || estimate.modelVersion !== MODEL_VERSION) return prior
  if (!isSameYard(estimate.learned.prior, prior)) return prior
  return { shelter: estimate.learned.shelter, skyView: estimate.learned.skyView }
}
