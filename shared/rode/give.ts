import type { Rode } from '#shared/types/rode'
import { chainBreakingN, ropeBreakingN } from './breaking'
import type { Stretch } from './elasticSpan'
import { sizeOf } from './size'
import { chainStiffnessN, ropeStiffnessN } from './stiffness'

/** Why no surge can be worked out, and the field that would help, where one would. */
export interface NoGive { why: string, field?: string }

/** What stretches in a rode, and what each part breaks at, N (null where unknown). */
export interface Give { stretch: Stretch, breaking: { part: string, breakingN: number | null }[] }

export const nothingLeft = 'this rode has nothing left to stretch: fit a snubber'

/**
 * What gives in a surge: chain by its diameter, rope and snubber by their breaking strength.
 *
 * @returns the stiffnesses and strengths, or the reason and the field where a stiffness is unknown or nothing stretches
 * @throws FieldError for a size or strength out of range
 *
 * Source: see stiffness.ts and breaking.ts; a rode of chain alone, without a snubber, counts as giving nothing (ours).
 */
export function giveOf(rode: Rode): Give | NoGive {
  const { chain } = rode
  const rope = rode.rope && rode.rope.lengthM > 0 ? rode.rope : undefined
  const snubber = rode.snubber && rode.snubber.lengthM > 0 ? rode.snubber : undefined
  if (!rope && !snubber) return { why: nothingLeft, field: 'snubber' }
  const stretch: Stretch = {}
  const breaking: Give['breaking'] = []
  if (chain.lengthM > 0) {
    const size = sizeOf(chain, 'chain')
    if (!size) return { why: 'the stretch of the chain is unknown: give its diameter', field: 'chain.diameterMm' }
    stretch.chainN = chainStiffnessN(size.mm)
    breaking.push({ part: 'chain', breakingN: chainBreakingN(chain) })
  }
  for (const [part, line] of [['rope', rope], ['snubber', snubber]] as const) {
    if (!line) continue
    const breakingN = ropeBreakingN(line, part)
    if (breakingN === null) {
      return { why: `the stretch of the ${part} is unknown: give its breaking strength`, field: `${part}.breakingN` }
    }
    if (part === 'rope') stretch.ropeN = ropeStiffnessN(breakingN)
    else stretch.snubber = { lengthM: line.lengthM, stiffnessN: ropeStiffnessN(breakingN) }
    breaking.push({ part, breakingN })
  }
  return { stretch, breaking }
}
