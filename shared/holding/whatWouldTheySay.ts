import { evidenceCounts, splitIntoCells } from '#shared/holding/cells'
import { sdNames } from '#shared/holding/effects'
import { fitFreeCells } from '#shared/holding/freeCells'
import { fittedPulls } from '#shared/holding/holdingModel'
import { fitPooledCells } from '#shared/holding/pooledCells'
import { checkSize, recordOf } from '#shared/holding/readRequest'
import { modelVersion } from '#shared/holding/version'
import { canonicalOrder, dataHash } from '#shared/trial/canonical'
import { checkPulls } from '#shared/trial/checkPulls'
import { plainMeans } from '#shared/trial/plainMeans'
import type { FitAnswer, FitRequest } from '#shared/types/fit'
import type { HoldingSds } from '#shared/types/holding'

/** No random effect, no spread: the sds of an unpooled fit. */
function noSds(): HoldingSds {
  return Object.fromEntries(sdNames.map(name => [name, 0] as const)) as Record<(typeof sdNames)[number], number>
}

/**
 * What would these pulls say? Nothing is stored. One estimate for each design, seabed and modification in the request, in that
 * order, with the plain means beside it.
 *
 * Pooled: the holding model, as for the published pulls. Not pooled: one free mean for each of them, one sigma, exponents fixed, no
 * trial, day or rig effect and no priors. A mean that nothing bounds is null with the reason; so is sigma where nothing identifies
 * it. Where no pull set at all, both ways answer the same: no mean, no sigma. Loads in N, masses in kg, means in ln N at 15 kg,
 * flat pull.
 *
 * @throws RangeError naming the pull and field that cannot be read, or pulls (1 to 5 000) or effects (0 to 1 000) out of range
 */
export function answerFit(request: FitRequest): FitAnswer {
  const records = request.pulls.map(recordOf)
  checkPulls(records)
  checkSize(records)
  const pulls = canonicalOrder(records)
  const cells = [...splitIntoCells(pulls).values()]
  const pooled = request.pooled ?? true
  const fit = pooled && fittedPulls(pulls).length > 0
    ? fitPooledCells(pulls, cells)
    : { ...fitFreeCells(cells), sds: noSds() }
  return {
    estimates: cells.map(({ cell, pulls: own }, i) => ({
      ...cell,
      ...fit.cells[i]!,
      ...evidenceCounts(own),
      plainMeans: plainMeans(own),
    })),
    sigma: fit.sigma,
    sds: fit.sds,
    modelVersion,
    dataHash: dataHash(pulls),
  }
}
