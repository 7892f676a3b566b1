// Where everything of the cut through the rink lies on the drawing, for one width of it. Depths count down from the string.
import type { BuildSums } from '@/lib/advice/build-types'

export interface CutSize {
  width: number
  height: number
  /** Left and right of the ground: room for board and liner. */
  side: number
  top: number
  bottom: number
}

export const WIDE: CutSize = { width: 720, height: 240, side: 64, top: 64, bottom: 44 }
export const NARROW: CutSize = { width: 350, height: 250, side: 30, top: 78, bottom: 48 }

export interface CutLayout {
  size: CutSize
  ground: string
  water: string
  liner: string
  left: number
  right: number
  levelY: number
  boardTopY: number
  /** Foot of the boards at the high and at the low end. */
  highFootY: number
  lowFootY: number
  /** How many times the upright scale is the lengthwise one. */
  exaggeration: number
}

const BOARD_PX = 12
/** Liner outside the boards, drawn. */
const OUT_PX = 9
const OVER_PX = 7
/** Ground drawn under its lowest point. */
const UNDER_PX = 18

export function layOutCut(
  { section, water, boards }: Pick<BuildSums, 'section' | 'water' | 'boards'>,
  size: CutSize,
): CutLayout {
  const lengthM = section.at(-1)?.alongM ?? 1
  const lowestM = Math.max(...section.map(({ floorM }) => floorM))
  const boardTopM = lowestM - boards.heightM
  const left = size.side
  const right = size.width - size.side
  const pxPerM = (right - left) / lengthM
  const uprightPxPerM = (size.height - size.top - size.bottom - UNDER_PX) / Math.max(0.01, lowestM - boardTopM)
  const x = (alongM: number) => round(left + alongM * pxPerM)
  const y = (depthM: number) => round(size.top + (depthM - boardTopM) * uprightPxPerM)
  const floor = section.map(({ alongM, floorM }) => `${x(alongM)},${y(floorM)}`)
  const levelY = y(water.levelM)
  const bottomY = y(lowestM) + UNDER_PX
  const highFootY = y(section[0]?.floorM ?? 0)
  const lowFootY = y(section.at(-1)?.floorM ?? 0)
  const boardTopY = y(boardTopM)
  const overY = boardTopY - OVER_PX
  const outside = { left: left - BOARD_PX - OUT_PX, right: right + BOARD_PX + OUT_PX }
  return {
    size,
    ground: `M${floor.join(' L')} L${right},${bottomY} L${left},${bottomY} Z`,
    water: `M${left},${levelY} H${right} L${[...floor].reverse().join(' L')} Z`,
    liner: `M${outside.left},${highFootY} V${overY} H${left + 2} V${highFootY - 2} L${floor.slice(1, -1).join(' L')} L${right - 2},${lowFootY - 2} V${overY} H${outside.right} V${lowFootY}`,
    left,
    right,
    levelY,
    boardTopY,
    highFootY,
    lowFootY,
    exaggeration: uprightPxPerM / pxPerM,
  }
}

const round = (px: number) => Math.round(px * 10) / 10
