import type { Share } from './holding'
import type { SizeListing } from './catalogue'
import type { HoldingWind, RankingRequest } from './ranking'
import type { Family, PullEnd, Seabed } from './words'

/** An anchor to compare: a design, at a mass or at the common one. */
export interface AnchorWanted { design: string, massKg?: number }

/** Two to four anchors; with a plan for its seabeds, load and rode, else for a flat pull on every seabed they were pulled on. */
export interface ComparisonRequest {
  anchors: AnchorWanted[]
  /** common mass of the anchors that name none, kg */
  massKg?: number
  plan?: RankingRequest
}

/** What can be said of two anchors on one seabed: very likely, more likely, a coin-toss, or too few pulls of one to judge by. */
export type ComparisonVerdict = 'veryLikely' | 'moreLikely' | 'cannotTell' | 'notTested'

/** Two of the anchors on one seabed, by their places in the list asked for (0 the first). */
export interface ComparedPair {
  first: number
  second: number
  /** chance that the first's true median is the higher one, from the joint covariance */
  chance: number
  /** chance that the first holds more when each is pulled once, side by side on one day */
  oneTry: number
  /** first's median over the second's */
  ratio: { median: number, low90: number, high90: number }
  verdict: ComparisonVerdict
  /** the verdict as a sentence */
  words: string
}

/** How pulls ended, counted; a pull that never set or was fouled has no end. */
export interface EndCounts extends Record<PullEnd, number> { neverSet: number, fouled: number, pulls: number }

/** One of the anchors on one seabed. */
export interface ComparedHolding {
  holdingN: { median: number, low90: number, high90: number }
  /** once set, at the plan's wind; null without a plan */
  chance: number | null
  holdingWind: HoldingWind | null
  setShare: Share | null
  resetShare: Share | null
  veer: Share | null
  pulls: number
  days: number
  atLimit: number
  scaledFromKg: number | null
  /** of its unmodified pulls here, at every mass */
  ends: EndCounts | null
}

export interface ComparedSeabed {
  seabed: Seabed
  /** of the plan's mix; null without a plan */
  share: number | null
  /** in the order of the anchors; null where nothing is known */
  holdings: (ComparedHolding | null)[]
  pairs: ComparedPair[]
}

export interface ComparedAnchor {
  design: string
  name: string
  family: Family
  massKg: number
  /** the size of this very mass, as a chandlery states it; null where none is made */
  size: SizeListing | null
  /** over the plan's mix; null without a plan, or where a seabed has no estimate */
  worst: { seabed: Seabed, holdingWind: HoldingWind } | null
  weightedChance: number | null
}

export interface ComparisonAnswer {
  fit: { id: number, modelVersion: string, at: string }
  /** mass of the anchors that named none, kg */
  massKg: number
  /** the plan's load, N, and the share of holding its angle leaves; null without a plan, or where the rode cannot bound the load */
  loadN: number | null
  upliftFactor: number | null
  anchors: ComparedAnchor[]
  seabeds: ComparedSeabed[]
  /** one sentence a pair of anchors, over all seabeds */
  summary: string[]
  cautions: string[]
  /** seabeds that the asker may not read */
  hidden: number
}
