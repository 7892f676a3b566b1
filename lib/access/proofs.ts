// Proofs that a check was made. Only this folder can make them, so an unchecked caller does not compile.

declare const checked: unique symbol

/** The viewer may do P on this rink. */
export interface RinkAccess<P extends string = string> {
  readonly rinkId: string
  readonly [checked]: P
}

/** The viewer runs this server. */
export interface StaffAccess {
  readonly [checked]: 'staff'
}
