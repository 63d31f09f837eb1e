/** The share of holding left when the rode lifts the shank, and how unsure that share is. */

import { DEG_RAD } from '#shared/units/constants'

/** The published angles and shares, and beyond them our own line down to 0.10 at 25 degrees. */
const shares: readonly (readonly [angleDeg: number, share: number])[] = [
  [0, 1], [5, 0.75], [10, 0.6], [15, 0.41], [25, 0.1],
]

/** Greatest shank angle of the published series, rad: past it the factor is our extrapolation and a warning is due. */
export const publishedUpliftLimitRad = 15 * DEG_RAD

function checkAngle(angleRad: number): void {
  if (!(angleRad >= 0 && angleRad <= Math.PI / 2)) {
    throw new RangeError(`shank angle must be from 0 to pi/2 rad, got ${angleRad}`)
  }
}

/**
 * Uplift factor r: the share of its flat-pull holding that an anchor keeps at this shank angle.
 *
 * Linear between 0 deg 1.00, 5 deg 0.75, 10 deg 0.60 and 15 deg 0.41; from there linear to 0.10 at 25 deg, then constant.
 *
 * @param angleRad angle of the rode above the seabed at the shank, rad, 0 to pi/2
 * @returns share of holding, 0.10 to 1, no unit
 * @throws RangeError outside 0 to pi/2
 *
 * Source: the lower of two series, a seamanship text (75 % at 5 deg, 50 % at 15 deg) and Navy practice (81/60/41 % at
 * 5/10/15 deg, memory). Past 15 deg, and taking the lower of the two: ours.
 */
export function upliftFactor(angleRad: number): number {
  checkAngle(angleRad)
  const angleDeg = angleRad / DEG_RAD
  let [fromDeg, fromShare] = shares[0] ?? [0, 1]
  for (const [toDeg, toShare] of shares) {
    if (angleDeg <= toDeg) {
      return toDeg === fromDeg ? toShare : fromShare + (toShare - fromShare) * (angleDeg - fromDeg) / (toDeg - fromDeg)
    }
    fromDeg = toDeg
    fromShare = toShare
  }
  return fromShare
}

/**
 * Standard deviation tau_r of the logarithm of the uplift factor: 0.10 min(angle / 5 deg, 1) / r.
 *
 * @param angleRad angle of the rode above the seabed at the shank, rad, 0 to pi/2
 * @returns sd of ln r, no unit; 0 for a flat pull
 * @throws RangeError outside 0 to pi/2
 *
 * Source: ours, about the spread between the two published series.
 */
export function upliftSd(angleRad: number): number {
  const factor = upliftFactor(angleRad)
  return 0.1 * Math.min(angleRad / (5 * DEG_RAD), 1) / factor
}
