import type { SeabedFit, StoredFit } from '#shared/types/holding'
import type { SeabedShare } from '#shared/types/ranking'
import type { Seabed } from '#shared/types/words'
import type { DemandPoint } from '#shared/ranking/chance'
import type { DemandTable } from '#shared/ranking/speedSearch'

/** One seabed of the mix with its estimates, null where the fit has no number for it. */
export interface MixSeabed extends SeabedShare { fit: SeabedFit | null }

/** A seabed of the mix that carries a number. */
export interface NumberedMix extends MixSeabed { fit: SeabedFit }

/** What a plan asks, worked out once: at its own wind and by wind. */
export interface PlanDemand {
  /** survey total and the share of holding its angle leaves, at the plan's wind */
  surveyN: number
  upliftFactor: number
  survey: DemandPoint
  /** survey demand at lesser winds that already lift the shank past the published angles */
  lifted: readonly DemandPoint[]
  /** survey demand by gust speed, m/s */
  surveyByGust: DemandTable
  /** gust over mean at the plan's exposure */
  gustFactor: number
  /** table load with current at the plan's wind, and by the wind as entered; null outside the table */
  table: DemandPoint | null
  tableByWind: DemandTable | null
}

/** Everything a row is worked out from, besides its design and mass. */
export interface RankContext {
  demand: PlanDemand
  /** from anchoringVariance */
  variance: number
  target: number
  mix: readonly MixSeabed[]
}

/**
 * The mix with its estimates: shares of the same seabed added up, empty ones left out. A seabed has a number where the fit
 * holds pulls of any design on it.
 */
export function mixWithEstimates(seabeds: readonly SeabedShare[], fit: Pick<StoredFit, 'seabeds'>): MixSeabed[] {
  const shares = new Map<Seabed, number>()
  for (const { seabed, share } of seabeds) shares.set(seabed, (shares.get(seabed) ?? 0) + share)
  const mix: MixSeabed[] = []
  for (const [seabed, share] of shares) {
    const found = fit.seabeds.find(entry => entry.seabed === seabed && entry.designs.some(({ pulls }) => pulls > 0))
    if (share > 0) mix.push({ seabed, share, fit: found ?? null })
  }
  return mix
}

export function isNumberedMix(entry: MixSeabed): entry is NumberedMix {
  return entry.fit !== null
}

/** Share of the mix that has no number. */
export function unnumberedShare(mix: readonly MixSeabed[]): number {
  return mix.reduce((sum, entry) => sum + (entry.fit === null ? entry.share : 0), 0)
}

/** True where more than half of the mix has no number: no ranking is given then. */
export function mostlyUnnumbered(mix: readonly MixSeabed[]): boolean {
  return unnumberedShare(mix) > 0.5 + 1e-9
}
