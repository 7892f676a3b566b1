// Seasons: from July to June, named by the year they begin in. Ours: no outdoor rink north of the equator lives in July.

export interface Season {
  /** The year it begins in: 2026 for the winter of 2026-27. */
  year: number
  /** First and last night, 'yyyy-MM-dd'. */
  from: string
  to: string
}

/** The season that begins in July of a year. */
export function seasonOfYear(year: number): Season {
  return { year, from: `${year}-07-01`, to: `${year + 1}-06-30` }
}

/** The season a night belongs to. @param nightDate 'yyyy-MM-dd' */
export function seasonOf(nightDate: string): Season {
  const year = Number(nightDate.slice(0, 4))
  return seasonOfYear(nightDate.slice(5) >= '07-01' ? year : year - 1)
}

/** "2026–27" */
export function seasonName({ year }: Season): string {
  return `${year}–${String((year + 1) % 100).padStart(2, '0')}`
}
