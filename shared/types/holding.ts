import type { Family, NumberedSeabed, PullAfter, PullEnd, SettingOutcome, VeerOutcome } from './words'

/** One published pull as the fit takes it. Loads in N, horizontal at the anchor; angle of the shank in degrees. */
export interface PullRecord {
  /** trial slug: one rig, one place, one day */
  trial: string
  rig?: string
  /** sd of the rig's calibration error in ln load */
  calibrationSd?: number
  design: string
  family: Family
  massKg: number
  seabed: NumberedSeabed
  modification?: string
  /** false: never set, counted but not fitted */
  set: boolean
  /** 0 with set true: moved at the first step */
  heldN: number
  /** null: the rig's limit, or stopped early */
  movedN: number | null
  shankAngleDeg: number
  /** how it set; without it `set` alone decides (true: at the first try). Fouled pulls enter nothing. */
  setting?: SettingOutcome
  /** how it ended; without it a pull that never moved counts as ended by the rig's limit */
  end?: PullEnd
  /** what it did after breaking out; without it not tried */
  after?: PullAfter
  /** what it did when the load was turned; without it there was no veer pull */
  veer?: VeerOutcome
  /** false: made after a breakout in the same deployment; never counted as a pull of its own in fit or shares */
  fresh?: boolean
  /** links modified and unmodified pulls made back to back: same day, within 50 m, alternated */
  pair?: string
}

/** Standard deviations of the model's random terms, in ln load. */
export interface HoldingSds {
  family: number
  design: number
  designSeabed: number
  modification: number
  modificationSeabed: number
  trial: number
  anchorDay: number
}

/** A share from counts: beta-binomial mean with its 90 % interval; n the count behind it. */
export interface Share { mean: number, low90: number, high90: number, n: number }

/** What one design's unmodified pulls on one seabed say. Never pulled there: pulls 0, from the family, wider. */
export interface DesignEstimate {
  design: string
  family: Family
  /** ln N at 15 kg, flat pull, perfect rig */
  lnMean15Kg: number
  lnSd: number
  /** pulls that entered the fit, and the days they were made on */
  pulls: number
  days: number
  atLimit: number
  /** smallest and greatest mass pulled here, kg; null without pulls */
  massRangeKg: [number, number] | null
  /** greatest held/r(angle) of any pull here, scaled to 15 kg; null without pulls */
  mostShown15KgN: number | null
  /** share set at the first try, of pulls that were not fouled */
  setShare: Share | null
  /** share reset after a breakout */
  resetShare: Share | null
  /** share that stayed buried or reset in a veer pull */
  veerShare: Share | null
}

/** Joint posterior of the designs on one seabed. */
export interface SeabedFit {
  seabed: NumberedSeabed
  /** b_s, the published exponent of its soil kind */
  exponent: number
  /** posterior mean of beta_s */
  betaMean: number
  designs: DesignEstimate[]
  /** (n + 1) x (n + 1) row-major covariance of the designs' ln holding at 15 kg in the order above, then beta_s */
  covariance: number[]
}

/** Ratio of modified to unmodified holding; only back-to-back pairs carry a verdict. */
export interface ModificationEstimate {
  design: string
  modification: string
  seabed: NumberedSeabed
  lnRatio: number
  lnSd: number
  pulls: number
  pairs: number
  verdict: 'better' | 'worse' | 'noDifference' | 'cannotTell' | null
}

/** One run of the model over the published pulls. */
export interface HoldingFit {
  modelVersion: string
  dataHash: string
  sigma: number
  sds: HoldingSds
  seabeds: SeabedFit[]
  modifications: ModificationEstimate[]
}

/** A fit as stored: with its number and its time. */
export interface StoredFit extends HoldingFit { id: number, at: string }
