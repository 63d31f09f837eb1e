import type { Family, NumberedSeabed } from './words'
import type { HoldingSds } from './holding'

/** Most pulls, and most effects before anchor-day effects, that one request may ask to be fitted. */
export const mostPulls = 5000
export const mostEffects = 1000

/** A pull as a tester sends it to ask what it would say. */
export interface FitPull {
  trial: string
  design: string
  family: Family
  massKg: number
  seabed: NumberedSeabed
  modification?: string
  rig?: string
  calibrationSd?: number
  set?: boolean
  heldN: number
  movedN: number | null
  shankAngleDeg?: number
}

export interface FitRequest { pulls: FitPull[], pooled?: boolean }

/** Plain mean of `held` for one mass, failures included as 0: common practice. */
export interface PlainMean { massKg: number, meanN: number, atLeast: boolean, pulls: number }

export interface FitEstimate {
  design: string
  family: Family
  seabed: NumberedSeabed
  modification: string | null
  lnMean15Kg: number | null
  lnSd: number | null
  pulls: number
  days: number
  atLimit: number
  plainMeans: PlainMean[]
  why?: string
}

export interface FitAnswer {
  estimates: FitEstimate[]
  sigma: number | null
  sds: HoldingSds
  modelVersion: string
  dataHash: string
}
