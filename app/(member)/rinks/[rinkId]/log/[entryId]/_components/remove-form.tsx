// Taking an entry out of the log, and bringing it back.
'use client'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { deleteEntryAction, restoreEntryAction } from '../../actions'
import { useSend } from '@/components/hooks/use-send'

export function RemoveForm({ rinkId, entryId, isDeleted }: { rinkId: string; entryId: string; isDeleted: boolean }) {
  const { state, post, submit, isSending } = useSend(isDeleted ? restoreEntryAction : deleteEntryAction)
  const word = isDeleted ? 'Bring it back' : 'Delete this entry'
  return (
    <form action={post} onSubmit={(event) => submit(event)} className="mt-10">
      {state.status === 'error' ? (
        <Notice live tone="caution">
          {state.message}
        </Notice>
      ) : null}
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="entryId" value={entryId} />
      <Button type="submit" look={isDeleted ? 'main' : 'plain'} disabled={isSending}>
        {isSending ? 'One moment' : word}
      </Button>
      {isDeleted ? null : <p className="mt-2 text-note text-graphite">It can be brought back from its page.</p>}
    </form>
  )
}
