import { KN_MS } from '#shared/units/constants'
import { inRange } from '#shared/units/range'

/** Upper end of each Beaufort band in kn; force 12 has none and is entered by its lower end. Source: WMO code 1100, 10-minute mean at 10 m. */
const upperKn: readonly number[] = [1, 3, 6, 10, 16, 21, 27, 33, 40, 47, 55, 63, 64]

/**
 * Wind speed that a Beaufort force stands for: the upper end of its band, a 10-minute mean at 10 m. Force 12 is "64 kn or more" and gives 64 kn.
 *
 * @param force whole number, 0 to 12
 * @returns m/s
 * @throws RangeError when not a whole number from 0 to 12
 */
export function beaufortSpeedMs(force: number): number {
  const knots = upperKn[inRange('Beaufort force', force, 0, 12)]
  if (knots === undefined) throw new RangeError(`Beaufort force must be a whole number between 0 and 12, got ${force}`)
  return knots * KN_MS
}

/**
 * Beaufort force of a 10-minute mean wind at 10 m. The bands are whole knots, so the speed is rounded to one first. Source: WMO code 1100.
 *
 * @param speedMs m/s, 0 to 200
 * @throws RangeError outside that range
 */
export function beaufortForce(speedMs: number): number {
  const knots = Math.round(inRange('speedMs', speedMs, 0, 200) / KN_MS)
  if (knots < 1) return 0
  const force = upperKn.findIndex((upper, index) => index > 0 && index < 12 && knots <= upper)
  return force === -1 ? 12 : force
}
