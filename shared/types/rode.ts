import type { ChainGrade, RopeConstruction } from './words'

/** Chain: metric (diameterMm) or inch (sizeIn) sizes; a submerged weight wins over a size. Length 0 is allowed with a rope. */
export interface Chain {
  lengthM: number
  diameterMm?: number
  sizeIn?: string
  grade?: ChainGrade
  breakingN?: number
  submergedWeightNPerM?: number
}

export interface Rope {
  lengthM: number
  diameterMm?: number
  sizeIn?: string
  construction?: RopeConstruction
  breakingN?: number
  submergedWeightNPerM?: number
}

export interface Snubber {
  lengthM: number
  diameterMm?: number
  sizeIn?: string
  construction?: RopeConstruction
  breakingN?: number
}

export interface Shackle { sizeMm?: number, sizeIn?: string, breakingN?: number }

export interface Rode { chain: Chain, rope?: Rope, snubber?: Snubber }

export interface RodeRequest extends Rode {
  /** seabed to bow, m */
  heightM: number
  horizontalLoadN: number
  shackles?: Shackle[]
  overRoller?: boolean
}

export type RodeRegime = 'grounded' | 'lifting' | 'clear'

export interface StrengthPart { part: string, breakingN: number | null, allowedN: number | null, loadN: number, ok: boolean | null }

export interface RodeAnswer {
  regime: RodeRegime
  shankAngleDeg: number
  groundedChainM: number
  groundedRopeM: number
  spanM: number
  tensionBowN: number
  tensionAnchorN: number
  verticalAnchorN: number
  scope: number
  /** null where no length gives that angle: a weightless rode never lies flat */
  leastLengthZeroAngleM: number | null
  leastLength8DegM: number | null
  upliftFactor: number
  /** points from the anchor [0, 0] to the bow [spanM, heightM], m */
  curve: [number, number][]
  strength: StrengthPart[]
  weakest: string | null
}

/** Greatest horizontal load of a surge, N; or none, why, and the field that would help, where one would. */
export type SurgePeak = { peakN: number } | { peakN: null, why: string, field?: string }

/** Shortest length, m, or null; and why, or what to do instead, in words. */
export interface ShortestSnubber { lengthM: number | null, note?: string }

/** What the snubber does. Every figure is null where it is unknown or there is no snubber. */
export interface SnubberAdvice {
  /** at the design load, m, and as a share of its length */
  stretchM: number | null
  stretchShare: number | null
  peakWith: SurgePeak | null
  peakWithout: SurgePeak
  breakingN: number | null
  allowedN: number | null
  /** whether it may carry the tension at the bow under the design load; unknown is null, never ok */
  ok: boolean | null
  shortest: ShortestSnubber | null
  /** sentences for the reader */
  notes: string[]
}
