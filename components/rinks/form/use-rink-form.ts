// The state of the rink form: what is typed, what was wrong with it, and the way to the server.
'use client'
import { useState } from 'react'
import { useSend } from '@/components/hooks/use-send'
import type { FormAction, FormState } from '@/lib/http/form-state'
import { unitOf } from '@/lib/schemas/measures'
import { unitsOfCode, type Units } from '@/lib/units'
import { inUnits, MEASURE_OF, unitsIn, type FormValues } from './values'

export type RinkForm = ReturnType<typeof useRinkForm>

/** @param followsPlace Whether the units may follow the place until somebody chooses them. */
export function useRinkForm(action: FormAction, initial: FormValues, followsPlace = false) {
  const { state, post, submit, isSending } = useSend(action)
  // Without script the page comes back whole, and this is where what was typed is found again.
  const [values, setValues] = useState<FormValues>(state.values ?? initial)
  // A fault is shown until its field is touched.
  const [mended, setMended] = useState<{ of: FormState; names: string[] }>({ of: state, names: [] })
  const units = unitsIn(values)
  const [mayFollow, setMayFollow] = useState(followsPlace)
  const [offeredUnits, setOfferedUnits] = useState([unitsIn(initial)])

  const set = (changed: FormValues) => {
    setValues((before) => ({ ...before, ...changed }))
    setMended(({ of, names }) => ({ of: state, names: [...(of === state ? names : []), ...Object.keys(changed)] }))
  }
  const error = (name: string) =>
    mended.of === state && mended.names.includes(name) ? undefined : state.fields?.[name]

  return {
    state,
    post,
    submit,
    isSending,
    values,
    units,
    set,
    offeredUnits,
    chooseUnits: (chosen: Units) => {
      setMayFollow(false)
      setValues((before) => inUnits(before, chosen))
    },
    /** The usual units of a place that was chosen. */
    suggestUnits: (code: string) => {
      const suggested = unitsOfCode(code)
      if (!mayFollow || !suggested) return
      setOfferedUnits([suggested])
      setValues((before) => inUnits(before, suggested))
    },
    error,
    text: (name: string) => ({
      name,
      value: values[name] ?? '',
      error: error(name),
      unit: MEASURE_OF[name] && unitOf(MEASURE_OF[name], units),
      onChange: (event: { target: { value: string } }) => set({ [name]: event.target.value }),
    }),
    area: (name: string) => ({
      name,
      value: values[name] ?? '',
      error: error(name),
      onChange: (event: { target: { value: string } }) => set({ [name]: event.target.value }),
    }),
    choice: (name: string) => ({
      name,
      value: values[name] ?? '',
      error: error(name),
      onChoose: (value: string) => set({ [name]: value }),
    }),
    tick: (name: string) => ({
      name,
      checked: values[name] === 'on',
      onChange: (event: { target: { checked: boolean } }) => set({ [name]: event.target.checked ? 'on' : '' }),
    }),
  }
}
