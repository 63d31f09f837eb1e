import { cellKey, evidenceCounts } from '#shared/holding/cells'
import type { CellPulls } from '#shared/holding/cells'
import { logMass } from '#shared/holding/effects'
import { designShares } from '#shared/holding/shares'
import { upliftFactor } from '#shared/rode/uplift'
import { sizeExponent } from '#shared/seabed/seabeds'
import type { Moments } from '#shared/stats/contrasts'
import { settingOf } from '#shared/trial/observation'
import type { DesignEstimate, PullRecord, SeabedFit } from '#shared/types/holding'
import type { Family, NumberedSeabed } from '#shared/types/words'

export interface DesignName { design: string, family: Family }

/** Greatest and least mass that set here, kg; null without pulls. */
function massRangeKg(pulls: readonly PullRecord[]): [number, number] | null {
  if (pulls.length === 0) return null
  const masses = pulls.map(pull => pull.massKg)
  return [Math.min(...masses), Math.max(...masses)]
}

/** Greatest load that any pull here held, as a flat pull at 15 kg, N; null without pulls. */
function mostShown15KgN(pulls: readonly PullRecord[], exponent: number): number | null {
  if (pulls.length === 0) return null
  return Math.max(...pulls.map(({ heldN, massKg, shankAngleDeg }) =>
    heldN / upliftFactor(shankAngleDeg * Math.PI / 180) * Math.exp(-exponent * logMass(massKg))))
}

/**
 * What the fit says of one seabed.
 *
 * @param designs every design, in the order of `moments`; the last of the moments is beta_s
 * @param cells pulls by cell; only unmodified ones count here
 */
export function seabedFit(
  seabed: NumberedSeabed, designs: readonly DesignName[], moments: Moments, centre: number, cells: Map<string, CellPulls>,
): SeabedFit {
  const size = designs.length + 1
  const exponent = sizeExponent(seabed)
  const betaMean = moments.mean[size - 1]!
  const pulls = designs.map(({ design }) => cells.get(cellKey(design, seabed, null))?.pulls ?? [])
  const shares = designShares(pulls)
  const estimates = designs.map(({ design, family }, i): DesignEstimate => {
    const loaded = pulls[i]!.filter(pull => pull.set && settingOf(pull) !== 'fouled')
    return {
      design,
      family,
      lnMean15Kg: centre + moments.mean[i]!,
      lnSd: Math.sqrt(moments.covariance[i * size + i]!),
      ...evidenceCounts(pulls[i]!),
      massRangeKg: massRangeKg(loaded),
      mostShown15KgN: mostShown15KgN(loaded, exponent + betaMean),
      ...shares[i]!,
    }
  })
  return { seabed, exponent, betaMean, designs: estimates, covariance: Array.from(moments.covariance) }
}
