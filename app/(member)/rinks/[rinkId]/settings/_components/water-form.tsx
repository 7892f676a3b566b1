// One source of water: what it gives, and what is poured from it.
'use client'
import { FillDepthField } from '@/components/rinks/form/ice-fields'
import { RinkFormFrame } from '@/components/rinks/form/frame'
import { useRinkForm } from '@/components/rinks/form/use-rink-form'
import type { FormValues } from '@/components/rinks/form/values'
import { WaterFields } from '@/components/rinks/form/water-fields'
import { saveWaterAction } from '../actions'
import { Hidden } from './hidden'

export function WaterForm({ initial, isNew }: { initial: FormValues; isNew: boolean }) {
  const form = useRinkForm(saveWaterAction, initial)
  return (
    <RinkFormFrame form={form} submit={isNew ? 'Add this source' : 'Save'} busy="Saving">
      <Hidden form={form} names={['rinkId', 'units', 'sourceId']} />
      <WaterFields form={form} />
      <FillDepthField form={form} />
    </RinkFormFrame>
  )
}
