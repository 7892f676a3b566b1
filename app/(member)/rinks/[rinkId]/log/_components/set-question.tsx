// "Set?": what somebody found of a flood, asked where the flood is listed. Shown at once, taken back if it fails.
'use client'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { OUTCOMES, type Outcome } from '@/lib/schemas/log-choices'
import { OUTCOME_WORDS } from '@/lib/words/log'
import { answerSetAction } from '../actions'
import { useSend } from '@/components/hooks/use-send'

export interface SetQuestionProps {
  rinkId: string
  entryId: string
  version: number
  /** Poured so lately that "now" is a fair answer. */
  isRecent: boolean
  /** The flood in words, for who hears the page. */
  about: string
}

export function SetQuestion(props: SetQuestionProps) {
  return (
    <details className="text-left">
      <summary
        aria-label={`Set? ${props.about}`}
        className="ml-auto flex min-h-touch w-fit cursor-pointer list-none items-center rounded border-[1.5px] border-ink px-[18px] font-medium marker:content-none"
      >
        Set?
      </summary>
      <AnswerForm {...props} />
    </details>
  )
}

export function AnswerForm({
  rinkId,
  entryId,
  version,
  isRecent,
  canTakeBack,
}: SetQuestionProps & { canTakeBack?: boolean }) {
  const { state, post, submit, isSending } = useSend(answerSetAction)
  const [chosen, setChosen] = useState<Outcome | 'none' | null>(null)
  const fault = state.fields?.atTime
  const id = `found-${entryId}`
  if (isSending && chosen) {
    return (
      <p role="status" className="py-3">
        {chosen === 'none' ? 'Answer taken back' : OUTCOME_WORDS[chosen]},{' '}
        <span className="text-graphite">being written down</span>
      </p>
    )
  }
  return (
    <form action={post} onSubmit={(event) => submit(event)} noValidate className="mt-3">
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="entryId" value={entryId} />
      <input type="hidden" name="version" value={state.latest?.version ?? version} />
      <label htmlFor={id} className="mb-1 block font-medium">
        Seen at
      </label>
      {isRecent ? (
        <p id={`${id}-hint`} className="mb-1 text-note text-graphite">
          Left empty, it is now.
        </p>
      ) : null}
      <input
        id={id}
        name="atTime"
        type="time"
        defaultValue={state.values?.atTime ?? ''}
        aria-invalid={fault ? true : undefined}
        aria-describedby={
          [isRecent ? `${id}-hint` : '', fault ? `${id}-fault` : ''].filter(Boolean).join(' ') || undefined
        }
        className="min-h-14 w-full max-w-48 rounded border-[1.5px] border-graphite bg-sheet px-3 text-body text-ink aria-invalid:border-rust"
      />
      {fault ? (
        <p id={`${id}-fault`} className="mt-1 text-note text-rust">
          {fault}
        </p>
      ) : null}
      <div className="mt-3 flex flex-wrap gap-2.5">
        {OUTCOMES.map((outcome) => (
          <Button
            key={outcome}
            type="submit"
            name="outcome"
            value={outcome}
            look={outcome === 'set' ? 'main' : 'plain'}
            className="min-h-14"
            onClick={() => setChosen(outcome)}
          >
            {OUTCOME_WORDS[outcome]}
          </Button>
        ))}
        {canTakeBack ? (
          <Button type="submit" name="outcome" value="none" look="quiet" onClick={() => setChosen('none')}>
            Take the answer back
          </Button>
        ) : null}
      </div>
      {state.status === 'error' && !fault ? (
        <p role="alert" className="mt-2 text-note text-rust">
          {state.message}
        </p>
      ) : null}
    </form>
  )
}
