import type { DesignListing, SeabedListing } from './catalogue'
import type { ModificationEstimate, Share } from './holding'
import type { Attitude, Condition, Family, Fouling, NumberedSeabed, PullAfter, PullEnd, SettingOutcome, VeerOutcome } from './words'

/** What the public pages read. Loads in N, horizontal at the anchor; masses in kg. */

/** A part of a long list; pages count from 1. */
export interface Paged { total: number, page: number, pages: number }

export interface FitName { id: number, modelVersion: string, at: string }

/** A flat pull's holding: the true median with its 90 % interval. */
export interface HoldingInterval { median: number, low90: number, high90: number }

/** A pull as a tick on a strip: one load, scaled to the strip's mass and to a flat pull. */
export interface PullTick { loadN: number, atLimit: boolean }

/** Where a design was pulled, and how often. */
export interface TestedSeabed { seabed: NumberedSeabed, pulls: number }

export const designSorts = ['name', 'family', 'pulls', 'holding'] as const
export type DesignSort = (typeof designSorts)[number]

export interface DesignsQuery {
  search?: string
  family?: Family
  /** only designs pulled there */
  seabed?: NumberedSeabed
  /** only designs with a size within a fifth of it */
  massKg?: number
  tested?: 'yes' | 'no'
  sort?: DesignSort
  page?: number
}

export interface ListedDesign extends DesignListing {
  /** unmodified pulls that entered the newest fit */
  pulls: number
  tested: TestedSeabed[]
}

export interface DesignsPage extends Paged { designs: ListedDesign[] }

/** How often each word was recorded. */
export type Counts<Word extends string> = { word: Word, count: number }[]

/** How a design's pulls went, over all seabeds or on one. */
export interface Manner {
  pulls: number
  setting: Counts<SettingOutcome>
  end: Counts<PullEnd>
  after: Counts<PullAfter>
  veer: Counts<VeerOutcome>
  attitude: Counts<Attitude>
  fouling: Counts<Fouling>
  condition: Counts<Condition>
}

/** One design on one seabed, at the answer's mass. */
export interface DesignOnSeabed {
  seabed: NumberedSeabed
  /** null while there is no fit, or where it may not be read */
  holdingN: HoldingInterval | null
  scaledFromKg: number | null
  pulls: number
  days: number
  atLimit: number
  setShare: Share | null
  resetShare: Share | null
  veerShare: Share | null
  /** the newest pulls, at most 200 */
  ticks: PullTick[]
}

export interface ReadModification extends ModificationEstimate { name: string }

export interface DesignAnswer {
  design: DesignListing
  massKg: number
  fit: FitName | null
  seabeds: DesignOnSeabed[]
  manner: Manner
  modifications: ReadModification[]
  trials: { slug: string, day: string, place: string, pulls: number }[]
}

/** One design's row among those of a seabed. */
export interface SeabedRow {
  /** null where there is too little evidence to rank */
  rank: number | null
  design: string
  name: string
  family: Family
  holdingN: HoldingInterval
  pulls: number
  days: number
  atLimit: number
  scaledFromKg: number | null
  setShare: Share | null
  resetShare: Share | null
  veerShare: Share | null
  /** the order of this row and the next is a coin-toss */
  tiedWithNext: boolean
  ticks: PullTick[]
}

export interface SeabedAnswer {
  seabed: SeabedListing
  massKg: number
  fit: FitName | null
  /** the first fifty, highest median first */
  rows: SeabedRow[]
  /** too little evidence to rank, most pulls first; the first fifty */
  thin: SeabedRow[]
  ranked: number
  thinCount: number
  /** designs never pulled here */
  neverPulled: number
}

export interface TrialListing {
  slug: string
  day: string
  place: string
  tester: string
  rig: string
  seabeds: NumberedSeabed[]
  designs: number
  pulls: number
  invented: boolean
}

export interface TrialsAnswer extends Paged { trials: TrialListing[] }

export interface TrialRodeFacts { chainLengthM: number, chainDiameterMm: number, ropeLengthM?: number, ropeDiameterMm?: number, bowHeightM: number }

export interface TrialFacts {
  slug: string
  day: string
  place: string
  tester: string
  latitudeDeg: number | null
  longitudeDeg: number | null
  depthM: number
  windMs: number | null
  windFrom: string
  currentMs: number | null
  waveHeightM: number | null
  seaState: string
  procedure: string
  note: string
  rode: TrialRodeFacts
  invented: boolean
  rig: {
    name: string
    vessel: string
    method: string
    limitN: number
    stepsN: number[]
    holdS: number
    calibratedOn: string | null
    calibrationMethod: string
    calibrationSd: number | null
  }
}

export interface ReadPull {
  id: number
  ordinal: number
  design: string
  name: string
  massKg: number
  anchorSetting: string | null
  modification: { slug: string, name: string } | null
  pair: string | null
  seabed: NumberedSeabed
  setting: SettingOutcome
  firstTry: boolean
  fresh: boolean
  heldN: number
  movedN: number | null
  shankAngleDeg: number
  end: PullEnd | null
  creepMMin: number | null
  after: PullAfter | null
  veerDeg: number | null
  veer: VeerOutcome | null
  attitude: Attitude
  fouling: Fouling
  condition: Condition
  note: string
  /** the pull that stands in its place: this one was corrected */
  supersededBy: number | null
}

/** The tester's plain mean beside the fit's estimate, for one anchor on one seabed of the trial. */
export interface MeanBesideEstimate {
  design: string
  name: string
  massKg: number
  seabed: NumberedSeabed
  pulls: number
  meanN: number
  /** a pull ended at the rig's limit */
  atLeast: boolean
  estimateN: HoldingInterval | null
  /** one sentence */
  reason: string
}

export interface TrialReply { author: string, reply: string, publishedAt: string }

export interface TrialAnswer {
  trial: TrialFacts
  fit: FitName | null
  comparisons: MeanBesideEstimate[]
  replies: TrialReply[]
}

export interface TrialPullsAnswer { pulls: ReadPull[] }

export interface PullQuestion { question: string, mailAddress: string }
export interface PullQuestionAnswer { id: number, pullId: number, createdAt: string }
