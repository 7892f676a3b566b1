// The scheduled job acts for nobody in particular. Jobs, seeds and tests import it; routes, screens and
// services may not (eslint.config.mjs).
import type { RinkPermission } from './permissions'
import type { RinkAccess } from './proofs'

/** A proof for work that no person asked for. */
export function systemRinkAccess<P extends RinkPermission>(rinkId: string): RinkAccess<P> {
  return { rinkId } as RinkAccess<P>
}
