import type { Family, NumberedSeabed, PullAfter, PullEnd, SettingOutcome, SoilKind, VeerOutcome } from './words'

/** A pull as a release prints it: every fact of it, things by their slugs. Loads in N, angles in degrees, places in m. */
export interface ReleasePull {
  /** the trial's slug and the pull's number in it, such as hollin-roads-2024-04-16/3 */
  pull: string
  trial: string
  ordinal: number
  design: string
  massKg: number
  modification: string | null
  anchorSetting: string | null
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
  eastM: number | null
  northM: number | null
  attitude: string
  fouling: string
  condition: string
  note: string
  /** the pull that stands in its place; null where it stands itself */
  supersededBy: string | null
}

export interface DescribedSeabed { slug: NumberedSeabed, name: string, soil: SoilKind }
export interface DescribedDesign { slug: string, name: string, family: Family, familyName: string, description: string, settings: string[], invented: boolean }
export interface DescribedSize {
  design: string
  massKg: number
  shankLengthMm: number | null
  flukeWidthMm: number | null
  overallHeightMm: number | null
  shackleHoleMm: number | null
  material: string | null
  shankStrengthN: number | null
  finish: string | null
  stowsFlat: boolean | null
}
export interface DescribedModification { slug: string, name: string, description: string, addedMassKg: number | null }
export interface DescribedRig {
  slug: string
  name: string
  vessel: string
  method: string
  limitN: number
  stepsN: number[]
  holdS: number
  calibratedOn: string | null
  calibrationMethod: string
  calibrationSd: number | null
  invented: boolean
}
export interface DescribedTrial {
  slug: string
  rig: string
  tester: string
  day: string
  place: string
  latitudeDeg: number | null
  longitudeDeg: number | null
  depthM: number
  windMs: number | null
  windFrom: string
  currentMs: number | null
  waveHeightM: number | null
  seaState: string
  chainLengthM: number
  chainDiameterMm: number
  ropeLengthM: number | null
  ropeDiameterMm: number | null
  bowHeightM: number
  procedure: string
  note: string
  publishedAt: string
  invented: boolean
}

/** What the pulls of a release name, as it stood when the release was made. No prices: they are no evidence, and change. */
export interface DescribedRows {
  seabeds: DescribedSeabed[]
  designs: DescribedDesign[]
  sizes: DescribedSize[]
  modifications: DescribedModification[]
  rigs: DescribedRig[]
  trials: DescribedTrial[]
}

/** A file of a release; `rows` is null for one that is no table. */
export interface ReleaseFile { name: string, title: string, rows: number | null, bytes: number, sha256: string }

/** How an estimate moved from one release to the next: medians and 90 % intervals at 15 kg, flat pull, N. */
export interface EstimateMove {
  design: string
  name: string
  seabed: NumberedSeabed
  before: { median: number, low90: number, high90: number, pulls: number }
  after: { median: number, low90: number, high90: number, pulls: number }
  /** after over before */
  ratio: number
}

/** What changed since the release before. */
export interface ReleaseChanges {
  /** the release before; null for the first */
  since: string | null
  pulls: number
  corrections: number
  trials: string[]
  designs: { slug: string, name: string }[]
  modifications: { slug: string, name: string }[]
  seabeds: NumberedSeabed[]
  /** estimates of a design on a seabed that both releases give, and those that only this one gives */
  compared: number
  added: number
  /** of those compared: median moved by more than 15 % either way, and new median outside the earlier 90 % interval */
  movedMuch: number
  outside: number
  /** the middle of all ratios of the interval's width, after over before, in ln; null without any */
  widthRatio: number | null
  largest: EstimateMove[]
}

export interface ReleaseListing {
  version: string
  cutAt: string
  madeAt: string
  /** from when on it is open to everybody under its licence, and whether it is now */
  openFrom: string
  open: boolean
  licence: { name: string, title: string, url: string }
  citation: string
  invented: boolean
  notes: string
  /** SHA-256 of datapackage.json, which holds the hash of every table */
  hash: string
  fit: { modelVersion: string, dataHash: string }
  pulls: number
  files: ReleaseFile[]
  changes: ReleaseChanges
}

/** GET /api/releases, the newest first */
export interface ReleasesAnswer { releases: ReleaseListing[] }
