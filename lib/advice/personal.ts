// Which reasons are about the person and the hose. They cap a score by themselves and are never averaged with the ice.

const PERSONAL: ReadonlySet<string> = new Set([
  'hose_freezes',
  'hose_runs',
  'skin_freezes',
  'skin_bears',
  'fill_hose_freezes',
  'fill_hose_runs',
  'hands_freeze',
  'hands_bear',
])

/**
 * Whether the reason with this code limits the person or the hose, not the ice.
 *
 * @param code Code of a reason.
 * @returns Whether it does.
 *
 * Source: ours.
 */
export function isPersonal(code: string): boolean {
  return PERSONAL.has(code)
}
