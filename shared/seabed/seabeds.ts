import { numberedSeabeds } from '#shared/types/words'
import type { NumberedSeabed, Seabed, SoilKind } from '#shared/types/words'
import { inRange } from '#shared/units/range'
import { numberedFacts } from '#shared/seabed/numberedFacts'
import { unnumberedFacts } from '#shared/seabed/unnumberedFacts'
import type { SeabedFacts } from '#shared/seabed/facts'

const facts: Readonly<Record<Seabed, SeabedFacts>> = { ...numberedFacts, ...unnumberedFacts }

/** Exponents of mass by soil kind: UFC 4-159-03 (2005) tables 5-3 and 5-4, from memory; mixed is the mean of the two (ours). */
const exponents: Readonly<Record<Exclude<SoilKind, 'none'>, number>> = { soft: 0.92, mixed: 0.86, hard: 0.8 }

/**
 * What a seabed is: name, soil kind, plain description, chart notation, pattern for drawings and cautions.
 *
 * @throws RangeError when the slug is not one of the product's seabeds
 */
export function seabedFacts(seabed: Seabed): SeabedFacts {
  if (Object.hasOwn(facts, seabed)) return facts[seabed]
  throw new RangeError(`seabed must be one of ${Object.keys(facts).join(', ')}, got ${String(seabed)}`)
}

/** True for a seabed that can carry a holding figure. */
export function isNumbered(seabed: Seabed): seabed is NumberedSeabed {
  return (numberedSeabeds as readonly Seabed[]).includes(seabed)
}

/** The soil kind that decides how holding grows with mass; 'none' for a seabed without a number. */
export function soilKind(seabed: Seabed): SoilKind {
  return seabedFacts(seabed).soil
}

/**
 * Exponent b of holding with mass, H = H_R (W/W_R)^b: 0.92 soft, 0.86 mixed, 0.80 hard.
 * Source: UFC 4-159-03 (2005) eq. 26; values of its tables 5-3 and 5-4 from memory, taken far below the masses they were drawn up for.
 *
 * @throws RangeError for a seabed without a number
 */
export function sizeExponent(seabed: NumberedSeabed): number {
  const soil = soilKind(seabed)
  if (soil === 'none') throw new RangeError(`seabed must be one that carries a number, got ${String(seabed)}`)
  return exponents[soil]
}

/**
 * Holding of an anchor of another mass, by the power law H = H_R (W/W_R)^b (UFC 4-159-03 (2005) eq. 26).
 *
 * @param referenceHoldingN holding of the reference anchor, N, 0 to 1e8
 * @param referenceMassKg its mass, kg, 0.1 to 1e5
 * @param massKg mass wanted, kg, 0.1 to 1e5
 * @param exponent b, 0 to 2
 * @returns holding, N
 * @throws RangeError outside those ranges
 */
export function holdingAtMass(referenceHoldingN: number, referenceMassKg: number, massKg: number, exponent: number): number {
  inRange('referenceHoldingN', referenceHoldingN, 0, 1e8)
  const ratio = inRange('massKg', massKg, 0.1, 1e5) / inRange('referenceMassKg', referenceMassKg, 0.1, 1e5)
  return referenceHoldingN * ratio ** inRange('exponent', exponent, 0, 2)
}
