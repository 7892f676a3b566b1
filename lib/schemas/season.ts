// The season named in an address: the year it begins in. Anything else means the present one.
import { z } from 'zod'

export const seasonYearSchema = z.coerce.number().int().min(2000).max(2100).optional().catch(undefined)
