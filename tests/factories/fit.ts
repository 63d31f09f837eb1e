import type { DesignEstimate, SeabedFit, StoredFit } from '#shared/types/holding'
import type { CatalogueDesign } from '#shared/types/ranking'
import type { NumberedSeabed } from '#shared/types/words'

/** A design's estimate with plenty of pulls behind it; every figure invented. */
export function makeEstimate(design: string, medianN15Kg: number, more: Partial<DesignEstimate> = {}): DesignEstimate {
  return {
    design,
    family: 'plain-scoop',
    lnMean15Kg: Math.log(medianN15Kg),
    lnSd: 0.1,
    pulls: 12,
    days: 4,
    atLimit: 0,
    massRangeKg: [15, 20],
    mostShown15KgN: 1e6,
    setShare: { mean: 0.9, low90: 0.8, high90: 0.97, n: 12 },
    resetShare: null,
    veerShare: null,
    ...more,
  }
}

/** Joint covariance: each design its own variance, one variance shared by all, beta with its own and a covariance. */
export function makeCovariance(sds: readonly number[], sharedVariance = 0, betaSd = 0.08, betaCovariance = 0): number[] {
  const n = sds.length
  const matrix: number[] = []
  for (let i = 0; i <= n; i++) {
    for (let j = 0; j <= n; j++) {
      if (i === n && j === n) matrix.push(betaSd ** 2)
      else if (i === n || j === n) matrix.push(betaCovariance)
      else matrix.push(sharedVariance + (i === j ? (sds[i] ?? 0) ** 2 : 0))
    }
  }
  return matrix
}

export function makeSeabedFit(seabed: NumberedSeabed, designs: DesignEstimate[], more: Partial<SeabedFit> = {}): SeabedFit {
  return {
    seabed,
    exponent: 0.8,
    betaMean: 0,
    designs,
    covariance: makeCovariance(designs.map(design => design.lnSd)),
    ...more,
  }
}

/** Spread between pulls 0.30, trial and anchor-day 0.15 and 0.20. */
export function makeFit(seabeds: SeabedFit[], more: Partial<StoredFit> = {}): StoredFit {
  return {
    id: 7,
    at: '2025-03-01T00:00:00.000Z',
    modelVersion: 'test',
    dataHash: '0',
    sigma: 0.3,
    sds: { family: 0.3, design: 0.2, designSeabed: 0.2, modification: 0.1, modificationSeabed: 0.1, trial: 0.15, anchorDay: 0.2 },
    seabeds,
    modifications: [],
    ...more,
  }
}

export function makeDesign(slug: string, sizesKg: number[] = [10, 15, 20, 25, 35, 50]): CatalogueDesign {
  return { slug, name: slug.charAt(0).toUpperCase() + slug.slice(1), family: 'plain-scoop', sizesKg }
}
