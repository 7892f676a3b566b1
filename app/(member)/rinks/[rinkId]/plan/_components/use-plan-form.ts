// The state of the plan's form: what is typed, what is wrong with it, and the sums of the last figures that made sense.
'use client'
import { zodResolver } from '@hookform/resolvers/zod'
import { useEffect, useMemo, useState } from 'react'
import { useForm, useWatch } from 'react-hook-form'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { buildSums } from '@/lib/advice/build-sums'
import type { BuildSums } from '@/lib/advice/build-types'
import { buildPlanSchema } from '@/lib/schemas/build-plan'
import type { Units } from '@/lib/units'
import type { PlanValues } from './plan-values'

/** Two fields that are judged together are judged again together. */
const TOGETHER: Record<string, string[]> = {
  flow: ['bucketSize', 'bucketSeconds'],
  bucketSize: ['flow', 'bucketSeconds'],
  bucketSeconds: ['flow', 'bucketSize'],
}

export type PlanForm = ReturnType<typeof usePlanForm>

/** @param kept What the rink has: it stands in for sums when the very first figures make no sense. */
export function usePlanForm(initial: PlanValues, kept: PlanValues, units: Units) {
  const schema = useMemo(() => buildPlanSchema(units), [units])
  const { register, control, setValue, trigger, formState } = useForm({
    defaultValues: initial,
    resolver: zodResolver(schema),
    mode: 'onChange',
  })
  const values = useWatch({ control }) as PlanValues
  const parsed = useMemo(() => schema.safeParse(values), [schema, values])
  const [sums, setSums] = useState<BuildSums>(() => buildSums((parsed.success ? parsed : schema.safeParse(kept)).data!))
  const [summed, setSummed] = useState(parsed)
  if (summed !== parsed) {
    setSummed(parsed)
    if (parsed.success) setSums(buildSums(parsed.data))
  }
  const isHydrated = useHydrated()
  useEffect(() => {
    // What came in with the address is judged once at the start.
    if (!schema.safeParse(initial).success) void trigger()
  }, [schema, initial, trigger])
  const firstFaults = useMemo(() => faultsOf(schema.safeParse(initial)), [schema, initial])

  return {
    sums,
    values,
    isSound: parsed.success,
    isHydrated,
    set: (name: string, value: string) => setValue(name, value, { shouldValidate: true, shouldDirty: true }),
    error: (name: string) => (isHydrated ? formState.errors[name]?.message : firstFaults[name]),
    field: (name: string) => ({
      ...register(name, { deps: TOGETHER[name] }),
      defaultValue: initial[name] ?? '',
      error: isHydrated ? formState.errors[name]?.message : firstFaults[name],
    }),
  }
}

function faultsOf(result: { error?: { issues: { path: PropertyKey[]; message: string }[] } }): Record<string, string> {
  return Object.fromEntries((result.error?.issues ?? []).map(({ path, message }) => [String(path[0]), message]))
}
