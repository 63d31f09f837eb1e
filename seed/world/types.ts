import type {
  Attitude, Condition, Family, Fouling, NumberedSeabed, PullAfter, PullEnd, Seabed, SettingOutcome, SoilKind, VeerOutcome,
} from '../../shared/types/words'

/** A seabed of the product's list; `pulled` says whether the demo world has pulls on it. */
export interface WorldSeabed { slug: Seabed, soil: SoilKind, numbered: boolean, pulled: boolean }

export interface WorldFamily { slug: Family, name: string }

/** An invented design; `settings` are fluke settings that its maker provides (empty: none). */
export interface WorldDesign {
  slug: string
  name: string
  family: Family
  description: string
  invented: true
  settings: string[]
}

/** A chandlery's facts about one mass of a design. Lengths in mm, mass in kg, strength in N, price in minor units. */
export interface WorldSize {
  design: string
  massKg: number
  shankLengthMm: number
  flukeWidthMm: number
  overallHeightMm: number
  shackleHoleMm: number
  material: string
  shankStrengthN: number | null
  finish: string
  stowsFlat: boolean
  priceMinor: number
  currency: string
  /** YYYY-MM-DD */
  priceDate: string
}

/** A change to one design; what it adds to an anchor of 20 kg (negative: takes off), and what a yard asks for it, in minor units. */
export interface WorldModification {
  slug: string
  design: string
  name: string
  description: string
  addedMassKg: number
  priceMinor: number
  currency: string
  /** YYYY-MM-DD */
  priceDate: string
}

export interface WorldRig {
  slug: string
  name: string
  vessel: string
  limitN: number
  /** loads of the thrust table, rising, N */
  thrustStepsN: number[]
  holdTimeS: number
  calibrationDate: string
  calibrationMethod: string
  /** sd of the calibration error in ln load */
  calibrationSd: number
}

/** One day of pulls by one tester at one place with one rig. Position rounded to 0.01 degree. */
export interface WorldTrial {
  slug: string
  /** YYYY-MM-DD */
  day: string
  season: number
  sound: string
  place: string
  latitudeDeg: number
  longitudeDeg: number
  /** name of the tester */
  tester: string
  rig: string
  seabed: NumberedSeabed
  procedure: string
  windMs: number
  windFrom: string
  currentMs: number
  seaState: string
  waveHeightM: number
  depthM: number
  bowHeightM: number
  chainMm: number
  chainLengthM: number
  /** largest shank angle of the day, at the rig's limit with this rode, degrees */
  shankAngleDeg: number
  note: string
}

export interface WorldPull {
  trial: string
  /** 1, 2, 3 ... within the day */
  order: number
  design: string
  massKg: number
  anchorSetting: string | null
  modification: string | null
  /** the same id on both pulls of a back-to-back pair */
  pair: string | null
  seabed: NumberedSeabed
  setting: SettingOutcome
  /** set at the first try, without dragging first */
  firstTry: boolean
  /** greatest step kept for the hold time, N; 0 where none was */
  heldN: number
  /** first step at which it moved, N; null at the limit, stopped early, never set or fouled */
  movedN: number | null
  /** null where it never set or was fouled: there was nothing to end */
  end: PullEnd | null
  /** only after a breakout */
  after: PullAfter | null
  veerDeg: number | null
  veerOutcome: VeerOutcome | null
  attitude: Attitude
  fouling: Fouling
  condition: Condition
  /** false for a pull that follows a breakout in the same deployment */
  fresh: boolean
  /** mean creep at the step that moved it, m/min, only where `end` is crept */
  creepRateMPerMin: number | null
  /** from the trial's rounded position, m */
  eastM: number
  northM: number
  note: string | null
}

export interface World {
  seed: string
  sound: string
  tester: { slug: string, name: string, about: string }
  seabeds: WorldSeabed[]
  families: WorldFamily[]
  designs: WorldDesign[]
  sizes: WorldSize[]
  modifications: WorldModification[]
  rigs: WorldRig[]
  trials: WorldTrial[]
  pulls: WorldPull[]
}
