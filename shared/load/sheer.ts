import type { BoatType } from '#shared/types/words'
import { within } from '#shared/load/within'

/**
 * Angle to the wind that a boat is taken to sheer through when none is given: 15 for a multihull on a bridle, 30 for the others (common
 * practice, no source).
 *
 * @returns degrees
 */
export function defaultSheerDeg(type: BoatType): number {
  return type === 'sailMultihull' ? 15 : 30
}

/**
 * Drag area of a boat that lies at an angle to the wind: along = front cos psi, across = side [sin psi - sin(5 psi)/20]/0.95
 * (UFC 4-159-03, from memory); the rode carries the resultant, never less than head-on (ours).
 * Practical Sailor measured half more tension at +/-30 degrees and two to three times at +/-60: this formula says less than that.
 *
 * @param frontM2 drag coefficient times area from ahead, m2, 0 to 1e6
 * @param sideM2 drag coefficient times area from abeam, m2, 0 to 1e6
 * @param sheerRad angle to the wind, rad, 0 to pi/2
 * @returns m2
 * @throws RangeError outside those ranges
 */
export function sheerDragAreaM2(frontM2: number, sideM2: number, sheerRad: number): number {
  within('sheerRad', sheerRad, 0, Math.PI / 2)
  const along = within('frontM2', frontM2, 0, 1e6) * Math.cos(sheerRad)
  const across = within('sideM2', sideM2, 0, 1e6) * (Math.sin(sheerRad) - Math.sin(5 * sheerRad) / 20) / 0.95
  return Math.max(frontM2, Math.hypot(along, across))
}
