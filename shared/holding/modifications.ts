import { cellKey, evidenceCounts } from '#shared/holding/cells'
import type { CellPulls } from '#shared/holding/cells'
import type { Cell } from '#shared/holding/effects'
import type { Moments } from '#shared/stats/contrasts'
import { z90 } from '#shared/stats/normal'
import { heldInterval } from '#shared/trial/observation'
import type { ModificationEstimate, PullRecord } from '#shared/types/holding'

/** Ratios of modified to unmodified holding between these make no difference that matters (ours). */
export const noDifference: readonly [number, number] = [0.87, 1.15]

/**
 * The verdict on a modification, from the 90 % interval of its ln ratio: inside 0.87-1.15 no difference that matters; else all
 * above or below 1 better or worse; else the pulls cannot tell.
 */
export function modificationVerdict(lnRatio: number, lnSd: number): Exclude<ModificationEstimate['verdict'], null> {
  const low = lnRatio - z90 * lnSd
  const high = lnRatio + z90 * lnSd
  if (low >= Math.log(noDifference[0]) && high <= Math.log(noDifference[1])) return 'noDifference'
  if (low > 0) return 'better'
  return high < 0 ? 'worse' : 'cannotTell'
}

function pairIds(pulls: readonly PullRecord[]): Set<string> {
  return new Set(pulls.filter(pull => pull.pair !== undefined && heldInterval(pull) !== null)
    .map(pull => JSON.stringify([pull.trial, pull.pair])))
}

/** Back-to-back pairs: named alike in one trial, with both sides in the fit. */
export function countPairs(modified: readonly PullRecord[], unmodified: readonly PullRecord[]): number {
  const plain = pairIds(unmodified)
  return [...pairIds(modified)].filter(id => plain.has(id)).length
}

/** A modified cell that some pull of the fit was made in. */
export interface ModifiedCell { cell: Cell & { modification: string }, pulls: PullRecord[] }

/** Modified cells with pulls in the fit, in order. */
export function modifiedCells(cells: Map<string, CellPulls>): ModifiedCell[] {
  return [...cells.values()].flatMap(({ cell, pulls }) => {
    const { modification } = cell
    return modification === null || evidenceCounts(pulls).pulls === 0 ? [] : [{ cell: { ...cell, modification }, pulls }]
  })
}

/** What the fit says of one modified cell; without back-to-back pairs it carries no verdict. */
export function modificationEstimate({ cell, pulls }: ModifiedCell, moments: Moments, cells: Map<string, CellPulls>): ModificationEstimate {
  const { design, seabed, modification } = cell
  const lnRatio = moments.mean[0]!
  const lnSd = Math.sqrt(moments.covariance[0]!)
  const pairs = countPairs(pulls, cells.get(cellKey(design, seabed, null))?.pulls ?? [])
  return {
    design,
    modification,
    seabed,
    lnRatio,
    lnSd,
    pulls: evidenceCounts(pulls).pulls,
    pairs,
    verdict: pairs === 0 ? null : modificationVerdict(lnRatio, lnSd),
  }
}
