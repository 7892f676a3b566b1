// An open fill: how far it is, what to fear, what to do next, and what was done.
import { StandingCautions } from '@/components/rinks/standing-cautions'
import { Notice } from '@/components/ui/notice'
import type { FillingView, OpenFillView } from '@/lib/schemas/filling-view'
import { fillProgressSentence, fillSpreadSentence, fillWarningText, nextCheckSentence } from '@/lib/words/filling'
import { unbroken } from '@/lib/words/unbroken'
import { waterText } from '@/lib/words/quantities'
import { Corners } from './corners'
import { FillBar } from './fill-bar'
import { FillHistory } from './fill-history'
import { FILLING_CAUTIONS } from './filling-cautions'
import { CheckForm, FinishForms, HoseForm } from './fill-forms'

/** A bucket test and a floor are known to a tenth or so. Ours. */
const NEARLY = 0.9

export function OpenFill({ view, fill }: { view: FillingView; fill: OpenFillView }) {
  const { reader, rink, mayWrite } = view
  const { progress } = fill
  const warnings = [progress.leak, progress.hose].filter((caution) => caution !== null)
  const [lead = '', ...rest] = fillProgressSentence(progress, reader).split(/(?<=\.) /)
  const check = nextCheckSentence(progress, reader)
  const form = { rinkId: rink.id, units: reader.units }
  return (
    <>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        {unbroken(lead)} <em className="font-semibold text-hose not-italic">{unbroken(rest.join(' '))}</em>
      </h1>
      <p className="mb-5 max-w-[60ch] text-graphite">{fillSpreadSentence(progress, reader)}</p>
      <FillBar fill={fill} reader={reader} />
      {warnings.map((warning) => (
        <Notice key={warning.code} tone="caution">
          <p>{fillWarningText(warning, reader)}</p>
        </Notice>
      ))}
      <div className="gap-x-14 lg:grid lg:grid-cols-2">
        <div>
          {check ? <p className="mt-8 max-w-line font-medium">{check}</p> : null}
          {mayWrite ? (
            <>
              <HoseForm {...form} isRunning={progress.isRunning} flowLPerMin={fill.flowLPerMin} />
              <CheckForm {...form} lowCorner={fill.lowCorner} isFirst={progress.isCheckDue} />
              <FinishForms
                rinkId={rink.id}
                missing={progress.doneShare < NEARLY ? waterText(progress.litresLeft, reader) : ''}
              />
            </>
          ) : null}
        </div>
        <div>
          <Corners fill={fill} reader={reader} />
          <FillHistory fill={fill} reader={reader} now={view.readAt} />
        </div>
      </div>
      <StandingCautions codes={FILLING_CAUTIONS} reader={reader} heading="While the water runs" />
    </>
  )
}
