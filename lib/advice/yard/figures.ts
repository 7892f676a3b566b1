// The figures that learning a yard rests on. All ours, until many yards have been learned.

/** How far a setting made by eye may be off, one standard deviation. [0-1 scale] Half a step between the named shelters. */
export const PRIOR_SD = { shelter: 0.18, skyView: 0.12 }

/** Scatter of a true set time about the right yard's: layer, water, weather, model. [natural log] */
export const SET_TIME_LOG_SD = 0.15
/** How well the moment of a report is known. [min] */
export const MOMENT_MINUTES = { set: 20, set_before: 10, wet: 10 }
/** A drilled hole: reading it, and the growth since the sheet was last known. [mm], [share of the growth] */
export const DRILLED = { readingSdMm: 5, growthSd: 0.25 }

/** Beyond so many standard deviations a report pulls less and less. [-] 95 % efficient where scatter is normal (Holland & Welsch 1977). */
export const WILD_BEYOND_SD = 2.385

/** Fewer nights cannot be held against each other. */
export const LEAST_NIGHTS = 4
/** Only the newest reports count: a yard changes over the years, and the work stays bounded. */
export const MOST_REPORTS = 40
/**
 * What is learned must fit unseen nights better by this many standard errors of the gain. [-] Of 100 simulated yards that
 * were set right, 10 nights each, 5 were moved all the same; of 100 that were not, 19 to 94, by how far off they were.
 */
export const LEAST_GAIN_SE = 1.5

/** Yards for which each report is worked out; between them it is read off. [0-1] */
export const SHELTER_NODES = [0, 0.1, 0.2, 0.35, 0.5, 0.65, 0.8, 1]
export const SKY_VIEW_NODES = [0, 0.3, 0.5, 0.65, 0.8, 0.9, 1]
