import type { DesignEstimate } from './holding'
import type { Family, NumberedSeabed, Seabed, SoilKind } from './words'

/** A mass of a design with what a chandlery states about it; null is "not stated". Lengths in mm, price in minor units. */
export interface SizeListing {
  massKg: number
  shankLengthMm: number | null
  flukeWidthMm: number | null
  overallHeightMm: number | null
  shackleHoleMm: number | null
  material: string | null
  shankStrengthN: number | null
  finish: string | null
  stowsFlat: boolean | null
  price: { minor: number, currency: string, on: string } | null
}

export interface DesignListing {
  slug: string
  name: string
  family: Family
  familyName: string
  description: string
  /** fluke angles or the like that its maker provides */
  settings: string[]
  /** a design of the demo world */
  invented: boolean
  sizes: SizeListing[]
}

export interface SeabedListing {
  slug: Seabed
  name: string
  soil: SoilKind
  numbered: boolean
  description: string
  notation: string
  cautions: string[]
}

/** What a fit says of one design on one seabed, flat pull, perfect rig, at 15 kg. */
export interface EstimateListing extends DesignEstimate {
  seabed: NumberedSeabed
  holding15KgN: { median: number, low90: number, high90: number }
}

export interface SeabedsAnswer { seabeds: SeabedListing[] }
export interface EstimatesAnswer {
  fit: { id: number, modelVersion: string, at: string, dataHash: string }
  sigma: number
  estimates: EstimateListing[]
}
