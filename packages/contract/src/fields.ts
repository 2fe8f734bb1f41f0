import { z } from 'zod'

/** The kinds of value that rows are made of. */

const HUGE = 1e7
export const idSchema = z
  .string()
  .regex(/^[A-Za-z0-9][A-Za-z0-9._:-]{0,63}$/, 'must be 1 to 64 letters, digits, dots, colons or dashes')
export const text = (max: number) => z.string().trim().max(max)
export const label = (max: number) => z.string().trim().min(1, 'must not be empty').max(max)
export const anywhere = z.number().min(-HUGE).max(HUGE)
export const positive = z.number().positive('must be more than 0').max(HUGE)
export const notNegative = z.number().min(0, 'must be 0 or more').max(HUGE)
export const share = z.number().gt(0, 'must be more than 0').max(1, 'must be at most 1')
export const azimuth = z.number().min(-360).max(360)
export const count = z.number().int('must be a whole number').min(0).max(1000)
export const barDiameter = z.union(
  [6, 8, 10, 12, 16, 20, 25, 32, 40].map((d) => z.literal(d)),
  'must be a bar size: 6, 8, 10, 12, 16, 20, 25, 32 or 40',
)

export const rectangle = { widthMm: positive, heightMm: positive }
