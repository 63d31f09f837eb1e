import { within } from '#shared/load/within'

/** Density of air at 15 degrees C and sea level, kg/m3 (ISO 2533). */
export const AIR_KG_M3 = 1.225

/**
 * Velocity pressure 1/2 rho V^2. Agrees with 0.00256 V^2 psf, V in mph (ASCE 7).
 *
 * @param speedMs speed, m/s, 0 to 200
 * @param densityKgM3 density of the fluid, kg/m3, above 0 up to 2000; air by default
 * @returns Pa
 * @throws RangeError outside those ranges
 */
export function velocityPressurePa(speedMs: number, densityKgM3 = AIR_KG_M3): number {
  return 0.5 * within('densityKgM3', densityKgM3, 1e-6, 2000) * within('speedMs', speedMs, 0, 200) ** 2
}

/**
 * Drag of a body, F = 1/2 rho V^2 Cd A.
 *
 * @param dragAreaM2 drag coefficient times area, m2, 0 to 1e6
 * @param speedMs speed, m/s, 0 to 200
 * @param densityKgM3 density of the fluid, kg/m3; air by default
 * @returns N
 * @throws RangeError outside those ranges
 */
export function dragN(dragAreaM2: number, speedMs: number, densityKgM3 = AIR_KG_M3): number {
  return velocityPressurePa(speedMs, densityKgM3) * within('dragAreaM2', dragAreaM2, 0, 1e6)
}
