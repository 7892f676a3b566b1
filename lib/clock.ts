// The only place that reads the clock. Everything else takes `now` as an argument.

/** The present instant. */
export function readClock(): Date {
  return new Date()
}
