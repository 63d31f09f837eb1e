import { G } from '#shared/units/constants'
import { FieldError, mustBeWithin } from '#shared/utils/fieldError'
import type { Chain, Rode, Rope } from '#shared/types/rode'
import type { RodeInput, RodePart } from './catenary'
import { listed, sizeOf } from './size'

/** Share of steel's weight left in sea water: 1 - 1025 / 7850 = 0.869. */
export const steelInWater = 1 - 1025 / 7850

/** Share of nylon's weight left in sea water (density 1140 kg/m3 against 1025). */
export const nylonInWater = 0.101

/** Chain mass, kg/m, by diameter in mm. Source: DIN 766, memory. */
const chainKgPerM = [[6, 0.8], [7, 1.1], [8, 1.4], [10, 2.2], [13, 3.8]] as const

/**
 * Mass of chain, kg/m, dry: the metric list for 6, 7, 8, 10 and 13 mm, else 0.0219 d^2.
 *
 * @param diameterMm diameter of the link's wire, mm, 1 to 300
 * @throws FieldError outside that
 *
 * Source: DIN 766 (memory); other sizes by the square of the diameter (ours).
 */
export function chainMassKgPerM(diameterMm: number): number {
  mustBeWithin('diameterMm', diameterMm, 1, 300)
  return listed(chainKgPerM, diameterMm) ?? 0.0219 * diameterMm ** 2
}

/**
 * Mass of nylon rope, kg/m, dry: 0.00060 d^2.
 *
 * @param diameterMm diameter, mm, 1 to 300
 * @throws FieldError outside that
 *
 * Source: ours, within 5 % of the masses listed for three-strand nylon of 3/8 to 3/4 in.
 */
export function nylonMassKgPerM(diameterMm: number): number {
  mustBeWithin('diameterMm', diameterMm, 1, 300)
  return 0.0006 * diameterMm ** 2
}

/**
 * Length and submerged weight of a chain; a weight given wins over the size, and chain of length 0 needs neither.
 *
 * @throws FieldError where neither is given, or one is out of range
 */
export function chainPart(chain: Chain): RodePart {
  return partOf(chain, 'chain', mm => chainMassKgPerM(mm) * steelInWater * G)
}

/**
 * Length and submerged weight of a rope, taken as nylon unless its weight is given.
 *
 * @throws FieldError where neither a diameter nor a weight is given, or one is out of range
 */
export function ropePart(rope: Rope): RodePart {
  return partOf(rope, 'rope', mm => nylonMassKgPerM(mm) * nylonInWater * G)
}

function partOf(part: Chain | Rope, name: string, weightN: (mm: number) => number): RodePart {
  const { lengthM, submergedWeightNPerM } = part
  const size = sizeOf(part, name)
  if (submergedWeightNPerM !== undefined) return { lengthM, weightNPerM: submergedWeightNPerM }
  if (size) return { lengthM, weightNPerM: weightN(size.mm) }
  if (lengthM === 0) return { lengthM, weightNPerM: 0 }
  throw new FieldError(`${name}.diameterMm`, `give the ${name} a diameter or a submerged weight`)
}

/**
 * What the solver needs to know of a rode: its chain and rope with their weights. The snubber plays no part in the shape.
 *
 * @param rode as given
 * @param heightM seabed to bow, m
 * @param horizontalLoadN horizontal load, N
 * @throws FieldError naming a missing or refused size or weight
 */
export function solverInput(rode: Rode, heightM: number, horizontalLoadN: number): RodeInput {
  const chain = chainPart(rode.chain)
  return rode.rope && rode.rope.lengthM !== 0
    ? { heightM, horizontalLoadN, chain, rope: ropePart(rode.rope) }
    : { heightM, horizontalLoadN, chain }
}
