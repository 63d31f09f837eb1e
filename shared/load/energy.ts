import { swells } from '#shared/types/words'
import type { Swell } from '#shared/types/words'
import { FieldError } from '#shared/utils/fieldError'
import { within } from '#shared/load/within'

const speedsMs: Readonly<Record<Swell, number>> = { none: 0, sheltered: 0.25, moderate: 0.5, open: 1 }

/** Added water that surges with the hull, as a share of its mass (ours). */
const ADDED_MASS = 0.075

/**
 * Speed at which swell surges a boat back on her rode (ours).
 *
 * @returns m/s
 * @throws RangeError for a swell that is not one of the four
 */
export function surgeSpeedMs(swell: Swell): number {
  if (Object.hasOwn(speedsMs, swell)) return speedsMs[swell]
  throw new FieldError('swell', `swell must be one of ${swells.join(', ')}, got ${String(swell)}`)
}

/**
 * Kinetic energy that the rode has to take up in a surge: 1/2 m 1.075 v^2.
 *
 * @param displacementKg displacement, kg, 0 to 1e7
 * @param swell how the boat surges in that anchorage
 * @returns J
 * @throws RangeError outside those ranges
 */
export function surgeEnergyJ(displacementKg: number, swell: Swell): number {
  return 0.5 * within('displacementKg', displacementKg, 0, 1e7) * (1 + ADDED_MASS) * surgeSpeedMs(swell) ** 2
}
