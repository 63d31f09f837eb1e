import { mustBeWithin } from '#shared/utils/fieldError'

/**
 * Stiffness EA of steel chain, N: 78 d^2 kN, d in mm. A part stretches by tension x length / EA.
 *
 * @param diameterMm diameter of the link's wire, mm, 1 to 300
 * @throws FieldError outside that
 *
 * Source: common practice for studless chain, no source.
 */
export function chainStiffnessN(diameterMm: number): number {
  mustBeWithin('diameterMm', diameterMm, 1, 300)
  return 78_000 * diameterMm ** 2
}

/**
 * Stiffness EA of nylon rope, N: 3.54 x breaking strength.
 *
 * @param breakingN breaking strength, N, 1 to 1e9
 * @throws FieldError outside that
 *
 * Source: double-braid nylon, UFC 4-159-03 table 6-8; three-strand taken alike, within 30 % (ours).
 */
export function ropeStiffnessN(breakingN: number): number {
  mustBeWithin('breakingN', breakingN, 1, 1e9)
  return 3.54 * breakingN
}
