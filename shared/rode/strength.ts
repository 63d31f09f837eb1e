import type { RodeRequest, StrengthPart } from '#shared/types/rode'
import { chainBreakingN, ropeBreakingN } from './breaking'
import { chainWorkingLoadN, shackleStrength } from './workingLoad'

/** Safety factors on breaking strength. Source: UFC 4-159-03 table 3-7 (chain, chain around bends, synthetic rope). */
const factors = { chain: 3, chainRoundBends: 4, rope: 3 } as const

/** Share of a rope's strength left when wet (UFC 4-159-03 table 3-7), and when spliced. */
const wet = 0.85
const spliced = 0.9

/** Tensions in N where the greatest load of each part stands: chain at its upper end, all else at the bow. */
export interface Tensions { tensionJoinN: number, tensionBowN: number }

/** Every part of the rode with its strength, and the one that the load takes the greatest share of. */
export interface Strength { parts: StrengthPart[], weakest: string | null }

/**
 * What a rope or snubber may carry, N: breaking strength x 0.85 (wet) x 0.9 (splice) / 3.
 *
 * @param breakingN new, dry and unspliced, N
 *
 * Source: UFC 4-159-03 table 3-7; splice, common practice.
 */
export function ropeAllowedN(breakingN: number): number {
  return breakingN * wet * spliced / factors.rope
}

/**
 * What a part may carry: the smaller of breaking strength over its factor and the published working load.
 *
 * @returns N, or null where neither is known
 */
export function allowedN(breakingN: number | null, factor: number, workingN: number | null): number | null {
  if (breakingN === null) return workingN
  return workingN === null ? breakingN / factor : Math.min(breakingN / factor, workingN)
}

/**
 * Strength of every part of a rode against the greatest tension in it.
 *
 * An unknown strength is null and so is its verdict: unknown is never ok. The weakest part is the one, of those whose
 * strength is known, whose load is the greatest share of what it may carry. A shackle may stand anywhere in the rode and is
 * judged at the tension at the bow (ours); so is a snubber.
 *
 * @param rode chain, rope, snubber and shackles; overRoller: the chain bears over a roller or gypsy
 * @param tensions from the solved shape, N
 * @throws FieldError for a size or strength out of range
 *
 * Source: allowed loads, UFC 4-159-03 table 3-7; strengths, see breaking.ts and workingLoad.ts.
 */
export function strengthOf(
  rode: Pick<RodeRequest, 'chain' | 'rope' | 'snubber' | 'shackles' | 'overRoller'>, tensions: Tensions,
): Strength {
  const parts: StrengthPart[] = []
  const add = (part: string, breakingN: number | null, allowed: number | null, loadN: number) => {
    parts.push({ part, breakingN, allowedN: allowed, loadN, ok: allowed === null ? null : loadN <= allowed })
  }
  const { chain, rope, snubber, shackles = [], overRoller = false } = rode
  if (chain.lengthM > 0) {
    const breakingN = chainBreakingN(chain)
    const factor = overRoller ? factors.chainRoundBends : factors.chain
    add('chain', breakingN, allowedN(breakingN, factor, chainWorkingLoadN(chain)), tensions.tensionJoinN)
  }
  for (const [name, line] of [['rope', rope], ['snubber', snubber]] as const) {
    if (!line || line.lengthM === 0) continue
    const breakingN = ropeBreakingN(line, name)
    add(name, breakingN, breakingN === null ? null : ropeAllowedN(breakingN), tensions.tensionBowN)
  }
  shackles.forEach((shackle, index) => {
    const { breakingN, workingN } = shackleStrength(shackle, `shackles.${index}`)
    const name = shackles.length > 1 ? `shackle ${index + 1}` : 'shackle'
    add(name, breakingN, allowedN(breakingN, factors.chain, workingN), tensions.tensionBowN)
  })
  return { parts, weakest: weakestOf(parts) }
}

function weakestOf(parts: readonly StrengthPart[]): string | null {
  let weakest: string | null = null
  let most = 0
  for (const { part, allowedN: allowed, loadN } of parts) {
    if (allowed === null || loadN / allowed <= most) continue
    weakest = part
    most = loadN / allowed
  }
  return weakest
}
