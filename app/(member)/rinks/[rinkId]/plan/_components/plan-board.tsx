// The plan: the sums follow what is typed at once. Without script the form goes to the address, and the server reckons.
'use client'
import type { MouseEvent } from 'react'
import { useSend } from '@/components/hooks/use-send'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { PrintButton } from '@/components/ui/print-button'
import { unitsCode } from '@/lib/units'
import type { WordOptions } from '@/lib/words/options'
import { sumItems, sumsLead } from '@/lib/words/sums'
import { unbroken } from '@/lib/words/unbroken'
import { keepPlanAction } from '../actions'
import { BY_ADDRESS } from './by-address'
import { GroundFields } from './ground-fields'
import { PlanCautions } from './plan-cautions'
import type { PlanValues } from './plan-values'
import { PrintedGround } from './printed-ground'
import { SectionFigure } from './section-figure'
import { SumList } from './sum-list'
import { usePlanForm } from './use-plan-form'
import { WaterFields } from './water-fields'
import { Wetted } from './wetted'

interface Props {
  rinkId: string
  /** What was typed before, else what the rink has. */
  initial: PlanValues
  kept: PlanValues
  reader: WordOptions
  mayManage: boolean
  /** At the rink, 'yyyy-MM-dd'. */
  today: string
  years: readonly number[]
}

export function PlanBoard({ rinkId, initial, kept, reader, mayManage, today, years }: Props) {
  const { state, post, send, isSending } = useSend(keepPlanAction)
  // Without script the page comes back whole after keeping, and this is where what was typed is found again.
  const form = usePlanForm(state.values ?? initial, kept, reader.units)
  const { sums } = form
  const keep = (event: MouseEvent<HTMLButtonElement>) => {
    const element = event.currentTarget.form
    if (!element) return
    event.preventDefault()
    send(new FormData(element))
  }
  return (
    <>
      <h1 className="mb-5 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide print:mb-1 print:max-w-none print:text-lead">
        {unbroken(sumsLead(sums, reader))}
      </h1>
      <PrintedGround form={form} reader={reader} />
      <SectionFigure sums={sums} reader={reader} />
      <div className="gap-x-14 lg:grid lg:grid-cols-[1.25fr_1fr] lg:grid-rows-[auto_1fr] print:block">
        <form action={post} className="mt-8 print:hidden" noValidate onSubmit={(event) => event.preventDefault()}>
          <input type="hidden" name="rinkId" value={rinkId} />
          <input type="hidden" name="units" value={unitsCode(reader.units)} />
          <h2 className="mb-3 font-semibold">The ground</h2>
          <GroundFields form={form} units={reader.units} />
          <h2 className="mb-3 font-semibold">Water and boards</h2>
          <WaterFields form={form} units={reader.units} years={years} />
          {state.message ? (
            <Notice tone={state.status === 'error' ? 'caution' : 'plain'} live>
              {state.message} {Object.values(state.fields ?? {})[0] ?? ''}
            </Notice>
          ) : null}
          <div className="flex flex-wrap gap-3">
            {form.isHydrated ? null : (
              <Button type="submit" look="main" {...BY_ADDRESS}>
                Work out the sums
              </Button>
            )}
            {mayManage ? (
              <Button type="submit" onClick={keep} disabled={isSending}>
                Keep these for the rink
              </Button>
            ) : null}
            <PrintButton>Print</PrintButton>
          </div>
          {mayManage ? (
            <p className="mt-2 max-w-line text-note text-graphite">
              Keeps size, floor, boards, price, flow and the mean depth of the fill.
            </p>
          ) : null}
        </form>
        <section className="mt-8 lg:row-span-2 print:mt-3">
          <h2 className="mb-2 font-semibold">What it takes</h2>
          {form.isSound ? null : (
            <Notice tone="caution" live>
              <p>These are still the sums of the last figures that made sense: something in the form needs a look.</p>
            </Notice>
          )}
          <SumList items={sumItems(sums, today, reader)} />
        </section>
        <Wetted sums={sums} reader={reader} />
      </div>
      <PlanCautions cautions={sums.cautions} reader={reader} />
    </>
  )
}
