import type { ModificationEstimate } from './holding'
import type { HoldingWind, RankingRequest } from './ranking'
import type { Fouling, NumberedSeabed, PullEnd, SettingOutcome } from './words'

/** A median with its 90 % interval, in the unit that the name of the field says. */
export interface Span { median: number, low90: number, high90: number }

/** Ratio of modified to unmodified holding of one design on one seabed; a verdict only from back-to-back pairs. */
export interface ModificationRatio {
  design: string
  seabed: NumberedSeabed
  ratio: Span
  pulls: number
  pairs: number
  verdict: ModificationEstimate['verdict']
}

export interface ModificationListing {
  slug: string
  name: string
  description: string
  /** what it adds to an anchor of 20 kg; null: not stated */
  addedMassKg: number | null
  price: { minor: number, currency: string, on: string } | null
  /** designs that it was tried on */
  designs: { slug: string, name: string }[]
  ratios: ModificationRatio[]
}

export interface ModificationsAnswer {
  fit: { id: number, modelVersion: string, at: string }
  modifications: ModificationListing[]
  hidden: number
}

/** One side of a back-to-back pair. */
export interface PairSide {
  massKg: number
  setting: SettingOutcome
  heldN: number
  movedN: number | null
  end: PullEnd | null
  fouling: Fouling
}

/** Modified and unmodified pulls made back to back: same day, within 50 m, alternated. */
export interface PulledPair {
  trial: string
  day: string
  place: string
  design: string
  seabed: NumberedSeabed
  modified: PairSide[]
  unmodified: PairSide[]
}

/** What the change is worth on one seabed, for one plan. */
export interface SeabedWorth {
  design: string
  seabed: NumberedSeabed
  /** holding of the unmodified anchor as this rode pulls, N */
  unmodifiedN: Span
  /** added to that, or taken away, by the ratio and its interval, N */
  changeN: Span
  /** holding wind of the unmodified anchor; null where the rode cannot bound the load */
  unmodifiedWind: HoldingWind | null
  /** change of the wind at which nine of ten hold, as mean and as gust, m/s; winds past 64 kn count as 64 kn */
  changeMs: { mean: Span, gust: Span, capped: boolean } | null
  /** the unmodified anchor that would hold as much as the modified one, kg */
  sameAsKg: Span
  verdict: ModificationEstimate['verdict']
}

/** What a modification is worth for one plan, seabed by seabed. */
export interface ModificationWorth {
  massKg: number
  loadN: number | null
  upliftFactor: number | null
  seabeds: SeabedWorth[]
}

export interface ModificationWorthRequest { modification: string, plan: RankingRequest }

export interface ModificationAnswer {
  fit: { id: number, modelVersion: string, at: string }
  modification: ModificationListing
  /** the newest pairs behind it */
  pairs: PulledPair[]
  /** pairs on record in all */
  pairsInAll: number
  /** what mud and clay say against sand and gravel; null where the pulls do not say it */
  cohesive: string | null
  /** for the reference plan: 11 m sail monohull, 30 kn of gusts, flat pull, 20 kg */
  worth: ModificationWorth
  reference: RankingRequest
  /** sizes of its designs with their prices */
  sizes: { design: string, massKg: number, price: { minor: number, currency: string, on: string } | null }[]
  hidden: number
}

export interface ModificationWorthAnswer {
  fit: { id: number, modelVersion: string, at: string }
  modification: string
  worth: ModificationWorth
}
