// The yard that fits reports and prior best together, and how well it is known.
import { levenbergMarquardt } from 'ml-levenberg-marquardt'
import { PRIOR_SD } from './figures'
import type { HeldReport } from './misfit'
import type { Yard } from './types'

/** Backwards, so that a factor at 1 is still looked at from inside. [0-1 scale] */
const GRADIENT_STEP = -0.01
/** The misfits are nearly straight in both factors: a few rounds settle it. */
const ROUNDS = 12

/**
 * Most probable yard: the least squares of softened misfits, with the prior as one more observation of each factor.
 *
 * @param reports Ready reports; none gives the prior.
 * @param prior What is believed without them. [0-1]
 * @returns Factors. [0-1]
 *
 * Source: Levenberg (1944) and Marquardt (1963) as in ml-levenberg-marquardt. Its weights are left at 1, because its error
 * takes them otherwise than its step does; misfits come scaled instead.
 */
export function fitYard(reports: readonly HeldReport[], prior: Yard): Yard {
  if (reports.length === 0) return prior
  const zeros = new Float64Array(reports.length + 2)
  const { parameterValues } = levenbergMarquardt(
    { x: zeros.map((_, index) => index), y: zeros },
    (factors) => {
      const misfits = allMisfits(reports, prior, toYard(factors))
      return (index) => misfits[index]!
    },
    {
      initialValues: [prior.shelter, prior.skyView],
      minValues: [0, 0],
      maxValues: [1, 1],
      gradientDifference: [GRADIENT_STEP, GRADIENT_STEP],
      maxIterations: ROUNDS,
      errorTolerance: 1e-9,
    },
  )
  return toYard(parameterValues)
}

/**
 * Standard deviation of each factor about the fit, from the curvature of the squares there.
 *
 * @param reports Readied reports.
 * @param prior Shelter and open sky as the keeper gave them. [0-1]
 * @param yard The fit. [0-1]
 * @returns Standard deviations, on the scale of the factors. [0-1]
 *
 * Source: Laplace approximation; from memory.
 */
export function yardSd(reports: readonly HeldReport[], prior: Yard, yard: Yard): Yard {
  const here = allMisfits(reports, prior, yard)
  const slope = (moved: Yard) =>
    allMisfits(reports, prior, moved).map((misfit, i) => (misfit - here[i]!) / GRADIENT_STEP)
  const byShelter = slope({ ...yard, shelter: yard.shelter + GRADIENT_STEP })
  const bySky = slope({ ...yard, skyView: yard.skyView + GRADIENT_STEP })
  const shelter = dot(byShelter, byShelter)
  const sky = dot(bySky, bySky)
  const determinant = shelter * sky - dot(byShelter, bySky) ** 2
  return { shelter: Math.sqrt(sky / determinant), skyView: Math.sqrt(shelter / determinant) }
}

function allMisfits(reports: readonly HeldReport[], prior: Yard, yard: Yard): number[] {
  return [
    ...reports.map((report) => report.misfit(yard)),
    (yard.shelter - prior.shelter) / PRIOR_SD.shelter,
    (yard.skyView - prior.skyView) / PRIOR_SD.skyView,
  ]
}

const toYard = ([shelter, skyView]: number[]): Yard => ({ shelter: shelter!, skyView: skyView! })
const dot = (a: number[], b: number[]) => a.reduce((sum, one, index) => sum + one * b[index]!, 0)
