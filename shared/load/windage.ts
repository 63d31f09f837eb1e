import type { BoatType } from '#shared/types/words'
import type { WindagePart } from '#shared/types/load'

/** What the default areas are worked out from: type, length overall and beam (m), height of the hull's side at the bow (m). */
export interface HullSize { type: BoatType, lengthM: number, beamM: number, freeboardM: number }

/**
 * Area of the mast and boom from ahead or abeam, m2: 1.3 L high, 0.0125 L across; none on a motor boat (ours).
 *
 * @param type type of boat
 * @param lengthM length overall, m
 */
export function mastAreaM2(type: BoatType, lengthM: number): number {
  return type === 'motor' ? 0 : 1.3 * lengthM * 0.0125 * lengthM
}

/**
 * Default windage from ahead, part by part (areas ours). Drag coefficients beside the sources: hull 0.7 (Larsson and Eliasson, Principles of
 * Yacht Design, fig. 9.2: about 0.5 head-on, taken higher for what stands on deck), mast 1.0 and stays 1.2 (the same figure), canvas 1.2 (common practice).
 *
 * @param hull lengths in m, already checked
 * @returns parts that have an area, m2
 */
export function defaultWindage({ type, lengthM, beamM, freeboardM }: HullSize): WindagePart[] {
  const motor = type === 'motor'
  const square = lengthM * lengthM
  const cabinShare = { sailMonohull: 0.035, sailMultihull: 0.05, motor: 0.12 }[type]
  const gearShare = { sailMonohull: 0.022, sailMultihull: 0.03, motor: 0.02 }[type]
  const parts: WindagePart[] = [
    { part: 'hull', areaM2: (type === 'sailMultihull' ? 0.75 : 1) * beamM * freeboardM, dragCoefficient: 0.7 },
    { part: 'cabin and cockpit structure', areaM2: cabinShare * lengthM * beamM, dragCoefficient: 1 },
    { part: 'mast and boom', areaM2: mastAreaM2(type, lengthM), dragCoefficient: 1 },
    { part: 'stays and shrouds', areaM2: motor ? 0.2 : 0.0055 * square, dragCoefficient: 1.2 },
    { part: 'furled sails and covers', areaM2: motor ? 0 : 0.0125 * square, dragCoefficient: 1 },
    { part: 'sprayhood, bimini, dinghy, gear', areaM2: gearShare * square, dragCoefficient: 1.2 },
  ]
  return parts.filter(part => part.areaM2 > 0)
}

/**
 * Default side area that the wind finds when the boat sheers, m2: 0.14 L^2 and the mast (ours).
 *
 * @param type type of boat
 * @param lengthM length overall, m
 */
export function defaultSideAreaM2(type: BoatType, lengthM: number): number {
  return 0.14 * lengthM * lengthM + mastAreaM2(type, lengthM)
}
