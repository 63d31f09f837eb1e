import { evidenceCounts } from '#shared/holding/cells'
import type { CellPulls } from '#shared/holding/cells'
import { publishedPart } from '#shared/holding/holdingModel'
import { openSide } from '#shared/stats/cellMeans'
import type { CellIntervals } from '#shared/stats/cellMeans'
import { fitFreeMeans } from '#shared/stats/freeMeans'
import { heldInterval } from '#shared/trial/observation'

/** What an unpooled fit says of one cell. */
export interface FreeCell { lnMean15Kg: number | null, lnSd: number | null, why?: string }

function intervalsOf({ pulls }: CellPulls): CellIntervals {
  return pulls.flatMap((pull) => {
    const held = heldInterval(pull)
    if (held === null) return []
    const known = publishedPart(pull)
    return [{ lo: Math.log(held.heldN) - known, hi: Math.log(held.movedN) - known }]
  })
}

const unknownSpread = 'nothing in these pulls identifies the spread between pulls'
const middleOnly = `${unknownSpread}: the mean is the middle of what the pulls here have in common`

function reason(cell: CellIntervals, counts: { pulls: number }): string {
  if (counts.pulls === 0) return 'no pull here set, so there is no load to fit'
  const side = openSide(cell)
  if (side === 'above') return 'every pull here ended at the limit of the rig or was stopped early: the mean has no upper bound'
  if (side === 'below') return 'every pull here moved at the first step: the mean has no lower bound'
  return unknownSpread
}

/**
 * One free mean for each design, seabed and modification, one sigma, published exponents: no trial, day or rig effect and no
 * priors. Means are ln N at 15 kg, flat pull.
 */
export function fitFreeCells(cells: readonly CellPulls[]): { sigma: number | null, cells: FreeCell[] } {
  const intervals = cells.map(intervalsOf)
  const fit = fitFreeMeans(intervals)
  return {
    sigma: fit.sigma,
    cells: fit.cells.map((cell, i): FreeCell => (cell === null
      ? { lnMean15Kg: null, lnSd: null, why: reason(intervals[i]!, evidenceCounts(cells[i]!.pulls)) }
      : { lnMean15Kg: cell.mean, lnSd: cell.sd, ...(cell.sd === null ? { why: middleOnly } : {}) })),
  }
}
