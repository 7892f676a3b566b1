// Seasons: from July to June, named by the year they begin in. Ours: no outdoor rink north of the equator lives in July.

export interface Season {
  /** The year it begins in: 2026 for the winter of 2026-27. */
  year: number
  /** First and last night, 'yyyy-MM-dd'. */
  from: string
  to: string
}

/**
 * The season that begins in July of a year.
 *
 * @param year Calendar year.
 * @returns First and last night, 'yyyy-MM-dd'.
 *
 * Source: ours: July to June holds any northern winter whole.
 */
export function seasonOfYear(year: number): Season {
  return { year, from: `${year}-07-01`, to: `${year + 1}-06-30` }
}

/**
 * The season a night belongs to.
 *
 * @param nightDate 'yyyy-MM-dd'
 * @returns The season.
 *
 * Source: seasonOfYear.
 */
export function seasonOf(nightDate: string): Season {
  const year = Number(nightDate.slice(0, 4))
  return seasonOfYear(nightDate.slice(5) >= '07-01' ? year : year - 1)
}

/**
 * Name of a season, such as 2026–27.
 *
 * @param season From seasonOf.
 * @returns Name.
 *
 * Source: common practice.
 */
export function seasonName({ year }: Season): string {
  return `${year}–${String((year + 1) % 100).padStart(2, '0')}`
}
