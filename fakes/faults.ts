// Failures on request: a list of what to do wrong next, used up one by one.
import { z } from 'zod'

export interface Faults<Kind extends string> {
  /** Takes the body of POST /__fake/fault: {kind, times, id?}. Kind `none` forgets all. */
  add(body: unknown): void
  /** The next fault for this recipient, counted down. */
  take(id?: string): Kind | undefined
  clear(): void
}

export function createFaults<const Kind extends string>(kinds: readonly Kind[]): Faults<Kind> {
  const faultSchema = z.object({
    kind: z.enum([...kinds, 'none']),
    times: z.int().min(1).max(10_000).default(1),
    /** Only for this recipient. */
    id: z.string().optional(),
  })
  let pending: { kind: Kind; times: number; id?: string }[] = []
  return {
    add(body) {
      const { kind, times, id } = faultSchema.parse(body)
      if (kind === 'none') pending = []
      else pending.push({ kind: kind as Kind, times, id })
    },
    take(id) {
      const fault = pending.find((one) => one.id === undefined || one.id === id)
      if (!fault) return undefined
      fault.times -= 1
      pending = pending.filter(({ times }) => times > 0)
      return fault.kind
    },
    clear() {
      pending = []
    },
  }
}
