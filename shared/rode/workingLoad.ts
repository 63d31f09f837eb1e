import { G, LBF_N } from '#shared/units/constants'
import { mustBeWithin } from '#shared/utils/fieldError'
import type { Chain, Shackle } from '#shared/types/rode'
import { listed, sizeOf } from './size'

/** Published working loads of chain by size in inches, lbf. Source: 49 CFR 393.108. */
const chainInchLbf = {
  G30: [[1 / 4, 1300], [5 / 16, 1900], [3 / 8, 2650], [7 / 16, 3700], [1 / 2, 4500]],
  G43: [[1 / 4, 2600], [5 / 16, 3900], [3 / 8, 5400], [7 / 16, 7200], [1 / 2, 9200]],
} as const

/** Ultimate loads of shackles by size in inches, lbf. Source: RR-C-271; up to 7/16 in from memory. */
const shackleInchLbf = [
  [1 / 4, 5000], [5 / 16, 7500], [3 / 8, 10_000], [7 / 16, 15_000], [1 / 2, 20_000], [5 / 8, 32_500], [3 / 4, 47_500],
] as const

/** Ultimate over working load of RR-C-271 shackles. */
const shackleFactor = 5

/** Working loads of shackles by size in mm, t. Source: EN 13889, memory. */
const shackleMetricT = [[7, 0.5], [8, 0.75], [10, 1], [11, 1.5], [13, 2], [16, 3.25]] as const

/**
 * Published working load of a chain, N: by inch size and grade only, never by a diameter in mm.
 *
 * @returns N, or null where none is listed
 *
 * Source: 49 CFR 393.108, grades 30 and 43, 1/4 to 1/2 in.
 */
export function chainWorkingLoadN(chain: Chain): number | null {
  const inch = sizeOf(chain, 'chain')?.inch ?? null
  if (chain.grade !== 'G30' && chain.grade !== 'G43') return null
  const lbf = listed(chainInchLbf[chain.grade], inch)
  return lbf === null ? null : lbf * LBF_N
}

/** Strength of a shackle, N: breaking and published working load, null where unknown or unlisted. */
export interface ShackleStrength { breakingN: number | null, workingN: number | null }

/**
 * Breaking strength and working load of a shackle.
 *
 * An inch size has a listed ultimate load and a fifth of it as working load; a metric size only a working load. A breaking
 * strength that the reader gives takes the place of the listed one.
 *
 * @param shackle breakingN 1 to 1e9 N
 * @param name its name in the request, such as `shackles.0`
 * @throws FieldError for a value out of range
 *
 * Source: RR-C-271 (1/4 to 7/16 in from memory), EN 13889 (memory).
 */
export function shackleStrength(shackle: Shackle, name: string): ShackleStrength {
  const { sizeMm, sizeIn, breakingN } = shackle
  if (breakingN !== undefined) mustBeWithin(`${name}.breakingN`, breakingN, 1, 1e9)
  const size = sizeOf({
    ...(sizeMm === undefined ? {} : { diameterMm: sizeMm }),
    ...(sizeIn === undefined ? {} : { sizeIn }),
  }, name, 'sizeMm')
  const ultimateLbf = listed(shackleInchLbf, size?.inch ?? null)
  const tonnes = size && size.inch === null ? listed(shackleMetricT, size.mm) : null
  const ultimateN = ultimateLbf === null ? null : ultimateLbf * LBF_N
  return {
    breakingN: breakingN ?? ultimateN,
    workingN: ultimateN !== null ? ultimateN / shackleFactor : tonnes === null ? null : tonnes * 1000 * G,
  }
}
