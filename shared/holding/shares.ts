import { betaBinomialShares } from '#shared/stats/betaBinomial'
import type { Count } from '#shared/stats/betaBinomial'
import { settingOf, standsAlone } from '#shared/trial/observation'
import type { PullRecord, Share } from '#shared/types/holding'

/** The three shares of one design on one seabed; null where nothing was tried. */
export interface DesignShares { setShare: Share | null, resetShare: Share | null, veerShare: Share | null }

type Outcome = (pull: PullRecord) => boolean | null

/** Set at the first try; an anchor that set after dragging did not. */
const setAtFirstTry: Outcome = pull => settingOf(pull) === 'set'

const resetAfterBreakout: Outcome = ({ after }) => (after === undefined || after === 'notTried' ? null : after === 'reset')

const keptThroughVeer: Outcome = ({ veer }) => (veer === undefined ? null : veer !== 'brokeOutAndDidNotReset')

function count(pulls: readonly PullRecord[], outcome: Outcome): Count {
  const results = pulls.filter(standsAlone).map(outcome).filter(result => result !== null)
  return { successes: results.filter(Boolean).length, trials: results.length }
}

function sharesOf(pullsByDesign: readonly (readonly PullRecord[])[], outcome: Outcome): (Share | null)[] {
  return betaBinomialShares(pullsByDesign.map(pulls => count(pulls, outcome)))
}

/**
 * Shares of every design on one seabed, each pulled towards what the designs there have in common.
 *
 * @param pullsByDesign unmodified pulls of each design on that seabed; fouled pulls and pulls after a breakout are left out
 */
export function designShares(pullsByDesign: readonly (readonly PullRecord[])[]): DesignShares[] {
  const set = sharesOf(pullsByDesign, setAtFirstTry)
  const reset = sharesOf(pullsByDesign, resetAfterBreakout)
  const veer = sharesOf(pullsByDesign, keptThroughVeer)
  return pullsByDesign.map((_, i) => ({ setShare: set[i] ?? null, resetShare: reset[i] ?? null, veerShare: veer[i] ?? null }))
}
