import { splitIntoCells } from '#shared/holding/cells'
import type { CellPulls } from '#shared/holding/cells'
import { contrastMaker } from '#shared/holding/contrastsOf'
import { holdingModel } from '#shared/holding/holdingModel'
import { modificationEstimate, modifiedCells } from '#shared/holding/modifications'
import { namedSds, solverOptions } from '#shared/holding/sds'
import type { FitOptions } from '#shared/holding/sds'
import { seabedFit } from '#shared/holding/seabedFit'
import type { DesignName } from '#shared/holding/seabedFit'
import { modelVersion } from '#shared/holding/version'
import { fitMixedModel } from '#shared/stats/fitMixedModel'
import { canonicalOrder, dataHash } from '#shared/trial/canonical'
import { checkPulls } from '#shared/trial/checkPulls'
import type { HoldingFit, PullRecord } from '#shared/types/holding'

/** Every design anywhere in the data, by slug. */
function designsOf(cells: Map<string, CellPulls>): DesignName[] {
  const families = new Map([...cells.values()].map(({ cell }) => [cell.design, cell.family]))
  return [...families].sort(([a], [b]) => (a < b ? -1 : 1)).map(([design, family]) => ({ design, family }))
}

/**
 * Fits the holding model to published pulls: the estimate of every design on every seabed with pulls in the fit, with the joint
 * covariance of the designs there; shares that set, reset and kept through a veer; ratios of modified to unmodified holding. A design
 * never pulled on a seabed is predicted there from its family, with a wider interval and pulls 0.
 *
 * The same pulls in any order give the same bytes; scaling all loads by k scales every holding by k. Loads in N, masses in kg,
 * holding as ln N at 15 kg, flat pull, perfect rig.
 *
 * @throws RangeError naming the first pull that cannot be read, or when no pull set
 */
export function fitHolding(pulls: readonly PullRecord[], options: FitOptions = {}): HoldingFit {
  checkPulls(pulls)
  const ordered = canonicalOrder(pulls)
  const model = holdingModel(ordered)
  const cells = splitIntoCells(ordered)
  const designs = designsOf(cells)
  const seabeds = [...new Set(model.fitted.map(pull => pull.seabed))].sort()
  const modified = modifiedCells(cells)
  const make = contrastMaker(model)
  const fit = fitMixedModel(model.mixed, [
    ...seabeds.map(seabed => [...designs.map(name => make.cell({ ...name, seabed, modification: null })), make.exponent(seabed)]),
    ...modified.map(({ cell }) => [make.modification(cell.design, cell.modification, cell.seabed)]),
  ], solverOptions(model, options))
  return {
    modelVersion,
    dataHash: dataHash(ordered),
    sigma: fit.sigma,
    sds: namedSds(model, fit),
    seabeds: seabeds.map((seabed, s) => seabedFit(seabed, designs, fit.moments[s]!, model.centre, cells)),
    modifications: modified.map((one, m) => modificationEstimate(one, fit.moments[seabeds.length + m]!, cells)),
  }
}
