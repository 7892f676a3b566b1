// What people on a rink are called, and what each may do.
import type { Role } from '@/lib/access/permissions'

export const ROLE_NAMES: Record<Role, string> = { keeper: 'Keeper', crew: 'Crew', skater: 'Skater' }

/** "Maren invites you as crew." */
export const AS_ROLE: Record<Role, string> = { keeper: 'as keeper', crew: 'as crew', skater: 'as a skater' }

/** Follows "can": a short list of what the role is for. */
export const ROLE_CAN: Record<Role, string> = {
  keeper: 'do all that crew can, change the settings, invite people, and delete the rink',
  crew: 'be told of good nights, check passes off and write the log',
  skater: 'see tonight, the week and the log',
}
