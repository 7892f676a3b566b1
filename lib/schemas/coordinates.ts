// Positions as people type or paste them: "45.9", "45,9", "77.3 W".
import { z } from 'zod'
import { parseNumber } from './measures'

const SIDES: Record<string, number> = { N: 1, E: 1, S: -1, W: -1 }

function parseDegrees(text: string, sides: string): number | undefined {
  const match = /^(.*?)\s*°?\s*([NSEW])?$/i.exec(text.trim())
  const number = parseNumber(match?.[1] ?? '')
  const side = match?.[2]?.toUpperCase()
  if (number === undefined || (side && !sides.includes(side))) return undefined
  return side ? Math.abs(number) * (SIDES[side] ?? 1) : number
}

function degrees(most: number, sides: string, missing: string) {
  return z.string(missing).transform((text, context) => {
    const value = parseDegrees(text, sides)
    if (value !== undefined && Math.abs(value) <= most) return value
    const name = most === 90 ? 'Latitude' : 'Longitude'
    if (text.trim() === '') context.addIssue(missing)
    else if (value === undefined)
      context.addIssue(`${name} is a number of degrees, like ${most === 90 ? '45.9' : '-77.3'}.`)
    else context.addIssue(`${name} runs from -${most} to ${most}: that is off the globe.`)
    return z.NEVER
  })
}

export const latitudeSchema = degrees(90, 'NS', 'Choose a place, or type its latitude.')
export const longitudeSchema = degrees(180, 'EW', 'Choose a place, or type its longitude.')

/** Queries of api/places: words, or a position. */
export const placeNameQuerySchema = z.object({
  q: z.string('Type the name of a place.').trim().min(2, 'At least two letters.').max(80, 'At most 80 letters.'),
})
export const positionQuerySchema = z.object({ latitude: latitudeSchema, longitude: longitudeSchema })
