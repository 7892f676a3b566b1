// Who may do what, in one table. Everything else asks here.

export type Role = 'keeper' | 'crew' | 'skater'
export type RinkPermission = 'view' | 'writeLog' | 'receiveAlerts' | 'manage'

const GRANTED: Record<Role, readonly RinkPermission[]> = {
  skater: ['view'],
  crew: ['view', 'receiveAlerts', 'writeLog'],
  keeper: ['view', 'receiveAlerts', 'writeLog', 'manage'],
}

/** True when the role includes the permission; screens use it to leave out buttons, services to refuse. */
export function isGranted(role: Role, permission: RinkPermission): boolean {
  return GRANTED[role].includes(permission)
}
