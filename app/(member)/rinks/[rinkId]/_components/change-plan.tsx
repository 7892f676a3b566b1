// The keeper's own plan: a way into changing it, and out again by keeping it or leaving it as it was.
'use client'
import { useState } from 'react'
import { useOnline } from '@/components/hooks/use-online'
import { useSlow } from '@/components/hooks/use-slow'
import { Button } from '@/components/ui/button'
import { IDLE } from '@/lib/http/form-state'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { keepOwnPassesAction } from '../actions'
import { planFields, withOwnPlan } from './kept-plan'
import type { ChangeView } from './use-tonight'

interface ChangePlanProps {
  view: TonightView
  passes: TonightPass[]
  isChanging: boolean
  change: ChangeView
  onOpen: () => void
  onClose: () => void
  onFault: (message: string | null) => void
}

export function ChangePlan({ view, passes, isChanging, change, onOpen, onClose, onFault }: ChangePlanProps) {
  const [isSaving, setIsSaving] = useState(false)
  const isSlow = useSlow(isSaving)
  const isOnline = useOnline()

  async function keep() {
    onFault(null)
    setIsSaving(true)
    const message = await change(() => keepOwnPassesAction(IDLE, planFields(view, passes)), withOwnPlan(view, passes))
    setIsSaving(false)
    if (message === null) onClose()
    else onFault(message)
  }

  if (!isChanging) {
    return isOnline ? (
      <Button look="quiet" className="-ml-[18px] print:hidden" onClick={onOpen}>
        Change the plan
      </Button>
    ) : null
  }
  return (
    <div className="mt-4 flex flex-wrap gap-3 print:hidden">
      <Button look="main" disabled={isSaving} onClick={keep}>
        {isSlow ? 'Keeping this plan…' : 'Keep this plan'}
      </Button>
      <Button onClick={onClose}>Leave it as it was</Button>
    </div>
  )
}
