import type { Verdict } from '#shared/types/ranking'
import { mostlyUnnumbered, type RankContext } from '#shared/ranking/context'
import type { Candidate } from '#shared/ranking/row'

/** Below this chance on its worst seabed an anchor does not hold. */
export const doesNotHoldBelow = 0.5

/**
 * The verdict on the reader's own anchor at its own mass: not tested where any numbered seabed of the mix is thin for it
 * or more than half of the mix has no number; holds where the chance once set on its worst seabed is at least the target;
 * does not hold below 0.5; marginal between.
 */
export function judgeOwn(context: Pick<RankContext, 'mix' | 'target'>, { ranked, chanceWorst }: Omit<Candidate, 'row'>): Verdict {
  if (!ranked || chanceWorst === null || mostlyUnnumbered(context.mix)) return 'notTested'
  if (chanceWorst >= context.target) return 'holds'
  return chanceWorst < doesNotHoldBelow ? 'doesNotHold' : 'marginal'
}
