import type { Family, RankingOrder, Seabed, Swell, Target } from './words'
import type { Boat, LoadAnswer, Wind } from './load'
import type { Rode, RodeAnswer } from './rode'
import type { Share } from './holding'

export interface SeabedShare { seabed: Seabed, share: number }

export interface RankingRequest {
  boat: Boat
  wind: Wind
  currentMs?: number
  swell?: Swell
  rode: Rode
  depthM: number
  riseM?: number
  fallM?: number
  waveHeightM?: number
  seabeds: SeabedShare[]
  own?: { design: string, massKg: number }
  massKg?: number
  target?: Target
  order?: RankingOrder
}

export type HoldingWind =
  | { meanMs: number, gustMs: number, atLeast: boolean }
  | { reason: 'doesNotReach' | 'beyond64kn' }

/** One design on one seabed of the mix, at the row's mass. */
export interface RankedSeabed {
  seabed: Seabed
  share: number
  /** null where the seabed has no number */
  holdingN: { median: number, low90: number, high90: number } | null
  upliftFactor: number
  chance: number | null
  setShare: Share | null
  holdingWind: HoldingWind | null
  tableWindMs: number | null
  veer: Share | null
  pulls: number
  days: number
  atLimit: number
  scaledFromKg: number | null
}

export interface RankedRow {
  /** null in the thin list and where the own anchor is not ranked */
  rank: number | null
  design: string
  name: string
  family: Family
  tiedWithNext: boolean
  reason: string
  worst: { seabed: Seabed, holdingWind: HoldingWind } | null
  weightedChance: number
  seabeds: RankedSeabed[]
  smallestServing: { survey: number | null, table: number | null }
  sizes: { massKg: number, chanceWorst: number | null }[]
}

export type Verdict = 'holds' | 'marginal' | 'doesNotHold' | 'notTested'

export interface RuleTableEntry {
  table: string
  source: string
  meanLengthM: number
  rowM: number | null
  anchorKg: number | null
  chainMm: number | null
  note?: string
}

export interface RankingAnswer {
  load: LoadAnswer
  rode: RodeAnswer | null
  massKg: number | null
  fit: { id: number, modelVersion: string, at: string }
  cautions: string[]
  ruleTables: RuleTableEntry[]
  rows: RankedRow[]
  thin: RankedRow[]
  own: { row: RankedRow, verdict: Verdict } | null
  hidden: number
}

/** A design with its real sizes, as the ranking needs it. */
export interface CatalogueDesign { slug: string, name: string, family: Family, sizesKg: number[] }
