import type { CompleteBoat } from '#shared/load/boat'
import { G } from '#shared/units/constants'
import { FieldError } from '#shared/utils/fieldError'
import { within } from '#shared/load/within'

/** Density of sea water, kg/m3, and its kinematic viscosity, m2/s (UFC 4-159-03). */
const SEA_KG_M3 = 1026
const SEA_VISCOSITY_M2_S = 1.19e-6

type Afloat = Pick<CompleteBoat, 'waterline' | 'displacementKg' | 'propellerAreaM2'>

/**
 * Load of a current on a boat that lies bow to it: form, friction and locked propeller. Source: UFC 4-159-03 eq. 15 to 23; propeller drag
 * coefficient 1.0 there, 0.05 m2 by default (ours).
 *
 * @param boat waterline length, waterline beam and draught in m, displacement in kg, propeller area in m2
 * @param currentMs speed of the water past the boat, m/s: 0, or 0.05 to 5
 * @returns N
 * @throws RangeError for a current outside that range
 */
export function currentLoadN(boat: Afloat, currentMs: number): number {
  if (currentMs === 0) return 0
  if (!(currentMs >= 0.05 && currentMs <= 5)) throw new FieldError('currentMs', `currentMs must be 0 or between 0.05 and 5, got ${String(currentMs)}`)
  const { lengthM, beamM, draughtM } = boat.waterline
  const pressurePa = 0.5 * SEA_KG_M3 * currentMs ** 2
  const wettedM2 = 1.7 * draughtM * lengthM + boat.displacementKg * G / (draughtM * SEA_KG_M3 * G)
  const reynolds = within('Reynolds number', currentMs * lengthM / SEA_VISCOSITY_M2_S, 2e4, 1e10)
  const frictionCoefficient = 0.075 / (Math.log10(reynolds) - 2) ** 2
  return pressurePa * (0.1 * beamM * draughtM + frictionCoefficient * wettedM2 + boat.propellerAreaM2)
}
