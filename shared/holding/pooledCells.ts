import { evidenceCounts } from '#shared/holding/cells'
import type { CellPulls } from '#shared/holding/cells'
import { contrastMaker } from '#shared/holding/contrastsOf'
import type { FreeCell } from '#shared/holding/freeCells'
import { holdingModel } from '#shared/holding/holdingModel'
import { namedSds, solverOptions } from '#shared/holding/sds'
import type { FitOptions } from '#shared/holding/sds'
import { fitMixedModel } from '#shared/stats/fitMixedModel'
import type { HoldingSds, PullRecord } from '#shared/types/holding'

/** A pooled answer: cells in the order given, with sigma and the sds. */
export interface PooledCells { sigma: number, sds: HoldingSds, cells: FreeCell[] }

const neverSet = 'no pull here set: predicted from its family and the seabed'
const unknownSeabed = 'no pull on this seabed set, so nothing says how it holds'

/**
 * The holding model's answer for every cell with pulls, modified ones included (a modified anchor's own holding, not its ratio).
 *
 * @param pulls in canonical order, at least one of them in the fit
 */
export function fitPooledCells(pulls: readonly PullRecord[], cells: readonly CellPulls[], options: FitOptions = {}): PooledCells {
  const model = holdingModel(pulls)
  const known = new Set(model.fitted.map(pull => pull.seabed))
  const make = contrastMaker(model)
  const asked = cells.filter(({ cell }) => known.has(cell.seabed))
  const fit = fitMixedModel(model.mixed, asked.map(({ cell }) => [make.cell(cell)]), solverOptions(model, options))
  const answers = cells.map(({ cell, pulls: own }): FreeCell => {
    const index = asked.findIndex(one => one.cell === cell)
    if (index < 0) return { lnMean15Kg: null, lnSd: null, why: unknownSeabed }
    const moments = fit.moments[index]!
    const estimate = { lnMean15Kg: model.centre + moments.mean[0]!, lnSd: Math.sqrt(moments.covariance[0]!) }
    return evidenceCounts(own).pulls === 0 ? { ...estimate, why: neverSet } : estimate
  })
  return { sigma: fit.sigma, sds: namedSds(model, fit), cells: answers }
}
