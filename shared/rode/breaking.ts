import { LBF_N } from '#shared/units/constants'
import { mustBeWithin } from '#shared/utils/fieldError'
import type { ChainGrade, RopeConstruction } from '#shared/types/words'
import { listed, sizeOf, type SizeGiven } from './size'

/** Breaking force of chain over the square of its diameter, N/mm2. Source: ASTM A413, grade = F / (0.005 pi d^2). */
const chainNPerMm2: Readonly<Record<ChainGrade, number>> = { G30: 471.2, G40: 628.3, G43: 675.4, G70: 1099.6 }

/** Three-strand nylon by diameter in mm, N, unspliced and dry. Source: ISO 1140, memory. */
const nylonMetricN = [[10, 20_400], [12, 29_400], [14, 40_200], [16, 52_000], [18, 65_700], [20, 81_400]] as const

/** Three-strand nylon by size in inches, lbf. Source: minimum breaking strength, agrees with CI 1303 from memory. */
const nylonInchLbf = [
  [3 / 8, 3240], [7 / 16, 4320], [1 / 2, 5670], [9 / 16, 7200], [5 / 8, 8910], [3 / 4, 12_780],
] as const

interface ChainGiven extends SizeGiven { grade?: ChainGrade, breakingN?: number }
interface RopeGiven extends SizeGiven { construction?: RopeConstruction, breakingN?: number }

function given(breakingN: number | undefined, field: string): number | null {
  if (breakingN === undefined) return null
  mustBeWithin(field, breakingN, 1, 1e9)
  return breakingN
}

/**
 * Breaking strength of a chain, N: what the reader gives, else by grade and diameter.
 *
 * @param chain with a breaking strength of 1 to 1e9 N, or a grade and a size
 * @returns N, or null where it is unknown
 * @throws FieldError for a value out of range
 *
 * Source: ASTM A413 clause 1.4.1.
 */
export function chainBreakingN(chain: ChainGiven): number | null {
  const own = given(chain.breakingN, 'chain.breakingN')
  const size = sizeOf(chain, 'chain')
  if (own !== null) return own
  return chain.grade && size ? chainNPerMm2[chain.grade] * size.mm ** 2 : null
}

/**
 * Breaking strength of a rope or snubber, N, new, dry and unspliced: what the reader gives, else three-strand nylon by its
 * list: metric by diameterMm, inch by sizeIn. Double braid, an unnamed construction and sizes off the list are unknown.
 *
 * @param rope with a breaking strength of 1 to 1e9 N, or a construction and a size
 * @param name its name in the request: `rope` or `snubber`
 * @returns N, or null where it is unknown
 * @throws FieldError for a value out of range
 *
 * Source: ISO 1140 (memory) for metric sizes, CI 1303 (memory) for inch sizes.
 */
export function ropeBreakingN(rope: RopeGiven, name: 'rope' | 'snubber'): number | null {
  const own = given(rope.breakingN, `${name}.breakingN`)
  const size = sizeOf(rope, name)
  if (own !== null) return own
  if (!size || rope.construction !== 'nylon3Strand') return null
  if (size.inch === null) return listed(nylonMetricN, size.mm)
  const lbf = listed(nylonInchLbf, size.inch)
  return lbf === null ? null : lbf * LBF_N
}
