import { add, alongAzimuth, scale, turnedLeft } from './geometry'
import type { Pan, Point } from './model'

/** The recess of a stressing pan in plan, mm: from the bearing face outwards along the jack's axis. */
export function panOutline(pan: Pick<Pan, 'x' | 'y' | 'azimuth' | 'along' | 'across'>): Point[] {
  const axis = alongAzimuth(pan.azimuth)
  const side = turnedLeft(axis)
  const corner = (along: number, across: number) => add(add(pan, scale(axis, along)), scale(side, across))
  const half = pan.across / 2
  return [corner(0, half), corner(pan.along, half), corner(pan.along, -half), corner(0, -half)]
}
