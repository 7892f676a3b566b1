// Bias and scatter of a set of predictions, and the shape of a line of the validation table.

export interface ErrorSummary {
  n: number
  bias: number
  rmse: number
}

/** One line of `npm run validate`. */
export interface ValidationLine {
  set: string
  unit: string
  model: ErrorSummary
  /** Other models on the same cases. */
  others: Record<string, ErrorSummary>
  bar: string
  isMet: boolean
}

/** Bias and root mean square of errors (model minus measured). */
export function summarise(errors: readonly number[]): ErrorSummary {
  const n = errors.length
  const bias = errors.reduce((sum, error) => sum + error, 0) / n
  const rmse = Math.sqrt(errors.reduce((sum, error) => sum + error * error, 0) / n)
  return { n, bias, rmse }
}
