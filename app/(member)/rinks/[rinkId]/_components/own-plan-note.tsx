// Whose plan this is, where it is not the advised one, and the way back.
'use client'
import { useActionState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { isGranted } from '@/lib/access/permissions'
import { IDLE } from '@/lib/http/form-state'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { dropOwnPassesAction } from '../actions'
import type { ChangeView } from './use-tonight'

interface OwnPlanNoteProps {
  view: TonightView
  change: ChangeView
  onFault: (message: string | null) => void
}

export function OwnPlanNote({ view, change, onFault }: OwnPlanNoteProps) {
  const [, submitWithoutScript] = useActionState(dropOwnPassesAction, IDLE)
  const own = view.outlook?.ownPlan
  if (!own) return null

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    const fields = new FormData(event.currentTarget)
    onFault(null)
    onFault(await change(() => dropOwnPassesAction(IDLE, fields), view))
  }

  return (
    <form
      action={submitWithoutScript}
      onSubmit={submit}
      className="flex flex-wrap items-center gap-x-4 pb-2 text-note text-graphite"
    >
      <input type="hidden" name="rinkId" value={view.rink.id} />
      <input type="hidden" name="nightDate" value={view.night.date} />
      <p>{own.by ? `Changed by ${own.by}.` : 'Changed by hand.'} Set times follow the newest forecast.</p>
      {isGranted(view.viewer.role, 'manage') ? (
        <Button type="submit" look="quiet" className="-ml-[18px] print:hidden">
          Back to the advised plan
        </Button>
      ) : null}
    </form>
  )
}
