/** Shank angles of one rode, tabulated once so that a ranking need not solve the rode for every design and wind. */

/** Shank angle (rad) at a horizontal load (N, more than 0). */
export type AngleAt = (loadN: number) => number

const intervals = 96
const leastLoadN = 1

/** From this shank angle on, rad, the uplift factor no longer falls (25 degrees): steeper ones need not be told apart. */
const steepestRad = 25.001 * Math.PI / 180

/** The load (N) past which the angle is more than a limit (rad), by halving ln load; the most where it never is. */
function loadAtAngle(angleAt: AngleAt, limitRad: number, mostLoadN: number): number {
  if (!(angleAt(mostLoadN) > limitRad)) return mostLoadN
  if (angleAt(leastLoadN) > limitRad) return leastLoadN
  let low = Math.log(leastLoadN)
  let high = Math.log(mostLoadN)
  while (high - low > 1e-9) {
    const middle = (low + high) / 2
    if (angleAt(Math.exp(middle)) > limitRad) high = middle
    else low = middle
  }
  return Math.exp(high)
}

/**
 * Tabulates the shank angle over ln load, from the load at which the rode lifts to the greatest asked for or to 25 degrees,
 * and hands back a fast reader of the table: 0 below the first, linear between, the last angle above.
 *
 * @param angleAt exact shank angle, rad, never falling with the load
 * @param mostLoadN greatest load of interest, N, more than 1
 * @returns the angle by load, within 0.02 degrees of the exact one up to 25 degrees; 25 degrees for anything steeper
 * @throws RangeError for a greatest load of 1 N or less
 */
export function tabulateAngle(angleAt: AngleAt, mostLoadN: number): AngleAt {
  if (!(mostLoadN > leastLoadN && mostLoadN < Infinity)) {
    throw new RangeError(`greatest load must be more than ${leastLoadN} N, got ${mostLoadN}`)
  }
  const lifting = loadAtAngle(angleAt, 0, mostLoadN)
  if (lifting === mostLoadN) return () => 0
  const steepest = loadAtAngle(angleAt, steepestRad, mostLoadN)
  const start = Math.log(lifting)
  const step = (Math.log(steepest) - start) / intervals
  if (!(step > 0)) return () => angleAt(leastLoadN)
  const angles = Float64Array.from({ length: intervals + 1 }, (_, i) => angleAt(Math.exp(start + i * step)))
  return (loadN) => {
    const place = (Math.log(loadN) - start) / step
    if (!(place > 0)) return lifting > leastLoadN ? 0 : angles[0] ?? 0
    if (place >= intervals) return angles[intervals] ?? 0
    const i = Math.floor(place)
    const from = angles[i] ?? 0
    return from + ((angles[i + 1] ?? from) - from) * (place - i)
  }
}
