// What was measured, with its date: the model beside drilled ice and finer sums, the advice beside thermometer rules.
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
      <AdviceTable />
    </section>
  )
}

function AdviceTable() {
  const figure = 'border-b border-rule py-2 pl-4 text-right whitespace-nowrap'
  return (
    <table className="w-full border-collapse border-t border-rule text-note">
      <caption className="sr-only">Advice on three measured winters</caption>
      <thead>
        <tr className="text-left">
          <th scope="col" className="border-b border-rule py-2 font-medium">
            Who
          </th>
          <th scope="col" className={`${figure} font-medium`}>
            Used
          </th>
          <th scope="col" className={`${figure} font-medium`}>
            Spoiled
          </th>
        </tr>
      </thead>
      <tbody>
        {ADVICE_FIGURES.map(({ who, usedPercent, spoiledPercent }) => (
          <tr key={who}>
            <th scope="row" className="border-b border-rule py-2 text-left font-normal">
              {who}
            </th>
            <td className={figure}>{percent(usedPercent)}</td>
            <td className={figure}>{percent(spoiledPercent)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
