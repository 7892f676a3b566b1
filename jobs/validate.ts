// `npm run validate`: the model over the measured data and the oracle tables, beside Stefan, Ashton and FLake.
import { hasMeasuredData } from '@/lib/validation/measured'
import { validateClearNights } from '@/lib/validation/clear-nights'
import { validateExactSolutions, validateSteadyGrowth, validateWetFluxes } from '@/lib/validation/oracle-tables'
import { validateFinland } from '@/lib/validation/finland'
import { validatePyhajarvi } from '@/lib/validation/pyhajarvi'
import type { ErrorSummary, ValidationLine } from '@/lib/validation/scores'

function collect(): ValidationLine[] {
  return [
    ...validatePyhajarvi(),
    ...validateFinland(),
    ...validateClearNights(),
    validateWetFluxes(),
    ...validateExactSolutions(),
    validateSteadyGrowth(),
  ]
}

function pair({ bias, rmse }: ErrorSummary, unit: string): string {
  const digits = unit === '-' ? 3 : 2
  return `${bias >= 0 ? '+' : ''}${bias.toFixed(digits)} / ${rmse.toFixed(digits)}`
}

function print(lines: ValidationLine[]): void {
  console.log(
    `${'set'.padEnd(36)}${'n'.padStart(5)}  ${'unit'.padEnd(5)}${'bias / RMSE'.padEnd(18)}${'bar'.padEnd(27)}others`,
  )
  for (const { set, unit, model, others, bar, isMet } of lines) {
    const beside = Object.entries(others).map(([name, summary]) => `${name} ${pair(summary, unit)}`)
    const verdict = bar === 'none' ? '-' : `${isMet ? 'met' : 'MISSED'}: ${bar}`
    console.log(
      `${set.padEnd(36)}${String(model.n).padStart(5)}  ${unit.padEnd(5)}${pair(model, unit).padEnd(18)}${verdict.padEnd(27)}${beside.join(', ')}`,
    )
  }
}

if (!hasMeasuredData()) {
  console.error('No measured data beside the project (../shared/data): nothing to validate against.')
} else {
  const lines = collect()
  if (process.argv.includes('--json')) console.log(JSON.stringify(lines, null, 2))
  else print(lines)
}
