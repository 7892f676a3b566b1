// What was measured, with its date: the model beside drilled ice and finer sums, the advice beside thermometer rules.
import { DataTable } from '@/components/ui/data-table'
import { dayText } from '@/components/rinks/reader'
import { ADVICE_FIGURES, MEASURED_ON, MODEL_FIGURES } from './accuracy'

const percent = (value: number) => `${value.toFixed(1)} %`

export function AccuracyTables() {
  return (
    <section className="mb-8 max-w-line">
      <h2 className="mb-2 font-semibold">How well it does</h2>
      <p className="mb-4">
        For ice thickness: the mean error, then the root mean square error. Measured on {dayText(MEASURED_ON)}{' '}
        {MEASURED_ON.slice(0, 4)}. No constant of the model was fitted to a lake; those of the exchange with the air
        were fitted to the fluxes named here.
      </p>
      <ul className="mb-6 list-none border-t border-rule p-0">
        {MODEL_FIGURES.map(({ against, figure }) => (
          <li key={against} className="gap-x-4 border-b border-rule py-2 sm:grid sm:grid-cols-[1fr_auto]">
            <span className="block">{against}</span>
            <span className="block font-medium">{figure}</span>
          </li>
        ))}
      </ul>
      <p className="mb-2">
        The advice, on three winters of measured weather, beside people who go by the thermometer at 8 pm. Used: good
        nights in which they flooded. Spoiled: floods that were still wet when snow, rain or the morning came.
      </p>
      <DataTable
        caption="Advice on three measured winters"
        columns={[{ head: 'Who' }, { head: 'Used', isFigure: true }, { head: 'Spoiled', isFigure: true }]}
        rows={ADVICE_FIGURES.map(({ who, usedPercent, spoiledPercent }) => ({
          key: who,
          cells: [who, percent(usedPercent), percent(spoiledPercent)],
        }))}
      />
    </section>
  )
}
