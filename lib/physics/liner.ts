// The liner: how much it takes to lie on the floor, go up and over the boards and down their outside.
import { inRange } from './check'

export interface LinerEdges {
  /** Height of the boards where they are highest. [m], 0 to 3 */
  boardHeightM: number
  /** Thickness of the boards, crossed on top. [m], 0 to 0.5; 0 when the liner is fastened to the inside */
  boardThicknessM: number
  /** Down the outside, each side. [m], 0 to 3 */
  tuckM: number
}

export interface LinerAllowance extends LinerEdges {
  /** More for creases, folds in the corners and a floor that is not flat, as a share. [0-0.5] */
  foldShare: number
  /** To spare, each side: liners are laid out by hand and not quite straight. [m], 0 to 3 */
  overlapM: number
}

/**
 * Liner wanted in one direction before folds and overlap: across the floor, up both boards, over them, down outside.
 *
 * @param insideM Rink between the boards. [m], 0.1 to 500
 * @param edges Ranges at the fields.
 * @returns Length of liner. [m]
 * @throws RangeError outside the ranges.
 *
 * Source: geometry; up and over the boards is common practice.
 */
export function linerAcrossM(insideM: number, { boardHeightM, boardThicknessM, tuckM }: LinerEdges): number {
  const edge =
    inRange('boardHeightM [m]', boardHeightM, 0, 3) +
    inRange('boardThicknessM [m]', boardThicknessM, 0, 0.5) +
    inRange('tuckM [m]', tuckM, 0, 3)
  return inRange('insideM [m]', insideM, 0.1, 500) + 2 * edge
}

/**
 * Liner to order in one direction.
 *
 * @param insideM Rink between the boards. [m], 0.1 to 500
 * @param allowance Ranges at the fields.
 * @param stepM Liners are cut to whole steps of this. [m], above 0 to 5
 * @returns Rounded up to the next step. [m]
 * @throws RangeError outside the ranges.
 *
 * Source: linerAcrossM × (1 + fold share) + 2 × overlap.
 */
export function linerToOrderM(insideM: number, allowance: LinerAllowance, stepM: number): number {
  const folds = 1 + inRange('foldShare', allowance.foldShare, 0, 0.5)
  const wanted = linerAcrossM(insideM, allowance) * folds + 2 * inRange('overlapM [m]', allowance.overlapM, 0, 3)
  inRange('stepM [m]', stepM, 0.01, 5)
  // A hair of rounding error must not cost a whole step.
  return Math.ceil(wanted / stepM - 1e-9) * stepM
}
