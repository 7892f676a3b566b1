// Who may do what, in one table. Everything else asks here.

export type Role = 'keeper' | 'crew' | 'skater'
export type RinkPermission = 'view' | 'logFlood' | 'receiveAlerts' | 'manage'

const GRANTED: Record<Role, readonly RinkPermission[]> = {
  skater: ['view'],
  crew: ['view', 'receiveAlerts', 'logFlood'],
  keeper: ['view', 'receiveAlerts', 'logFlood', 'manage'],
}

/** True when the role includes the permission; screens use it to leave out buttons, services to refuse. */
export function isGranted(role: Role, permission: RinkPermission): boolean {
  return GRANTED[role].includes(permission)
}
