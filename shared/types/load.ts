import type { BoatType, Exposure, Swell, WindKind } from './words'
import type { Rode } from './rode'

/** One part the wind pushes on: area in m2 (0 to 5000), drag coefficient (0 to 3). */
export interface WindagePart { part: string, areaM2: number, dragCoefficient: number }

/** A boat as a reader gives it. Lengths in m, mass in kg, areas in m2. */
export interface Boat {
  type: BoatType
  lengthM: number
  beamM: number
  displacementKg?: number
  freeboardM?: number
  bowHeightM?: number
  windage?: WindagePart[]
  sideAreaM2?: number
  sideDragCoefficient?: number
  waterline?: { lengthM: number, beamM: number, draughtM: number }
  propellerAreaM2?: number
}

/** Wind as entered: speed in m/s, a mean or a gust. */
export interface Wind { speedMs: number, kind: WindKind, exposure?: Exposure, at10m?: boolean, sheerDeg?: number }

export interface LoadRequest {
  boat: Boat
  wind: Wind
  currentMs?: number
  swell?: Swell
  rode?: Rode
  heightM?: number
}

export interface LoadPart extends WindagePart { loadN: number }

export interface TableLoad {
  loadN: number
  rowFt: number
  decidedBy: 'length' | 'beam'
  neighbourN: number | null
}

export interface SurveyLoad {
  steadyN: number
  gustN: number
  sheerN: number
  currentN: number
  surgeN: number | null
  totalN: number | null
  parts: LoadPart[]
}

export interface LoadAnswer {
  table: TableLoad | null
  tableNote?: string
  survey: SurveyLoad
  designN: number | null
  notes: string[]
}
