import type { LoadPart, SurveyLoad, Wind, WindagePart } from '#shared/types/load'
import type { CompleteBoat } from '#shared/load/boat'
import { gustRatio, heightFactor } from '#shared/load/gust'
import { AIR_KG_M3 } from '#shared/load/pressure'
import { defaultSheerDeg, sheerDragAreaM2 } from '#shared/load/sheer'
import { DEG_RAD } from '#shared/units/constants'
import { within } from '#shared/load/within'

/** Wind loads of a boat, N: `steadyN` at the speed entered, `gustN` after the gust factor, `sheerN` the gust with the boat sheering; parts add up to `steadyN`. */
export interface WindLoads { steadyN: number, gustN: number, sheerN: number, parts: LoadPart[] }

/** Wind load per square of the speed entered, N s2/m2: load = factor x speedMs^2. */
export interface WindLoadFactors { steady: number, gust: number, sheer: number }

/** Drag coefficient times area, summed over the parts, m2. */
export function frontDragAreaM2(parts: readonly WindagePart[]): number {
  return parts.reduce((sum, { areaM2, dragCoefficient }) => sum + areaM2 * dragCoefficient, 0)
}

/** What one square metre of drag area bears per square of the speed entered, steady, N s2/m4. */
function perDragArea(wind: Pick<Wind, 'at10m'>): number {
  return 0.5 * AIR_KG_M3 * (wind.at10m ? heightFactor() ** 2 : 1)
}

/**
 * The wind loads of a fixed boat for every speed at once: they grow with its square, so a search over the wind multiplies these.
 * The boat is head to wind for steady and gust.
 *
 * @param boat a completed boat
 * @param wind kind, exposure, 10-m forecast or not, sheer angle in degrees 0 to 90; the speed is not used
 * @throws RangeError for an unknown kind or exposure, or a sheer angle outside its range
 */
export function windLoadFactors(boat: CompleteBoat, wind: Omit<Wind, 'speedMs'>): WindLoadFactors {
  const frontM2 = frontDragAreaM2(boat.windage)
  const sheerDeg = within('wind.sheerDeg', wind.sheerDeg ?? defaultSheerDeg(boat.type), 0, 90)
  const sheerM2 = sheerDragAreaM2(frontM2, boat.sideAreaM2 * boat.sideDragCoefficient, sheerDeg * DEG_RAD)
  const steady = perDragArea(wind)
  const gust = steady * gustRatio(wind) ** 2
  return { steady: steady * frontM2, gust: gust * frontM2, sheer: gust * sheerM2 }
}

/**
 * Wind part of the survey load, F = 1/2 rho V^2 sum(Cd A), with its parts.
 *
 * @param boat a completed boat
 * @param wind speed in m/s, 0 to 150, mean or gust, with exposure, height and sheer
 * @throws RangeError for a wind out of range
 */
export function windLoads(boat: CompleteBoat, wind: Wind): WindLoads {
  const square = within('wind.speedMs', wind.speedMs, 0, 150) ** 2
  const { steady, gust, sheer } = windLoadFactors(boat, wind)
  const partFactor = perDragArea(wind) * square
  return {
    steadyN: steady * square,
    gustN: gust * square,
    sheerN: sheer * square,
    parts: boat.windage.map(part => ({ ...part, loadN: partFactor * part.areaM2 * part.dragCoefficient })),
  }
}

/**
 * Puts the survey load together: totalN = max(sheerN, gustN + surgeN) + currentN, since measured sheer already holds snatch.
 *
 * @param wind wind loads, N
 * @param currentN load of the current, N, 0 or more
 * @param surgeN peak of the surge above the gust load, N; 0 without swell, null where the rode cannot bound it
 * @returns totalN null where surgeN is
 * @throws RangeError for a negative or unbounded load
 */
export function surveyLoad(wind: WindLoads, currentN: number, surgeN: number | null): SurveyLoad {
  within('currentN', currentN, 0, 1e9)
  const totalN = surgeN === null ? null : Math.max(wind.sheerN, wind.gustN + within('surgeN', surgeN, 0, 1e9)) + currentN
  return { steadyN: wind.steadyN, gustN: wind.gustN, sheerN: wind.sheerN, currentN, surgeN, totalN, parts: wind.parts }
}
