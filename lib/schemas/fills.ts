// What is done at a running fill: start, pause, resume, look, finish. Fields as people type them, in their own units.
import { z } from 'zod'
import { inUnitsOf, measured, noteSchema, orEmpty } from './fields'
import { rinkIdSchema } from './rinks'

/** Empty depth and flow are the rink's own. */
export const startFillSchema = inUnitsOf((units) =>
  z
    .object({
      rinkId: rinkIdSchema,
      fillDepth: orEmpty(measured('fillDepth', units)),
      flow: orEmpty(measured('flow', units)),
    })
    .transform(({ rinkId, fillDepth, flow }) => ({ rinkId, targetDepthMm: fillDepth, flowLPerMin: flow })),
)

/** An empty flow is that of the last time. */
export const resumeFillSchema = inUnitsOf((units) =>
  z
    .object({ rinkId: rinkIdSchema, flow: orEmpty(measured('flow', units)) })
    .transform(({ rinkId, flow }) => ({ rinkId, flowLPerMin: flow })),
)

/** Both may be empty: somebody was there, and all was well. */
export const checkFillSchema = inUnitsOf((units) =>
  z
    .object({ rinkId: rinkIdSchema, lowCornerDepth: orEmpty(measured('lowCornerDepth', units)), note: noteSchema })
    .transform(({ rinkId, lowCornerDepth, note }) => ({ rinkId, lowCornerDepthMm: lowCornerDepth ?? null, note })),
)

export const oneFillSchema = z.object({ rinkId: rinkIdSchema })

export type StartFillInput = z.output<typeof startFillSchema>
export type ResumeFillInput = z.output<typeof resumeFillSchema>
export type CheckFillInput = z.output<typeof checkFillSchema>
