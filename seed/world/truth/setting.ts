import type { Family } from '../../../shared/types/words'
import type { PulledSeabed } from './holding'

/**
 * Share that never set, least and greatest over designs, by seabed. Hard sand 0.20 to 0.50 and weed over sand 0.40 to 0.70
 * as the scenario states; magnitudes are common practice, no source.
 */
export const neverSetRange: Readonly<Record<PulledSeabed, readonly [number, number]>> = {
  'soft-mud': [0.02, 0.10],
  'firm-mud': [0.02, 0.10],
  'stiff-clay': [0.08, 0.30],
  'sandy-mud': [0.02, 0.10],
  'loose-sand': [0.02, 0.12],
  'hard-sand': [0.20, 0.50],
  'gravel': [0.10, 0.35],
  'cobble-over-sand': [0.15, 0.40],
  'weed-over-sand': [0.40, 0.70],
}

/** Where a design lies in those ranges: 0 sets most willingly, 1 least. Invented. */
export const reluctance: Readonly<Record<string, number>> = {
  orrelby: 0.7,
  quennick: 0.55,
  haskettle: 0.4,
  marrowby: 0.5,
  threlpin: 0.15,
  ebbwick: 0.25,
  dunnavet: 0.8,
  skelloway: 0.9,
  pellifrond: 0.85,
  vennimore: 1,
  cawdrith: 0.1,
  ulvesk: 0.15,
  hobbrel: 0.35,
  fennigar: 0,
  osterquill: 0.1,
  lapwistle: 0.3,
  yarrowmund: 0.45,
  gorsetter: 0.2,
}

/** Share fouled, of all pulls; and share that dragged before setting, of those that set: the others set at the first try. */
export const fouledShare = 0.015
export const setAfterDraggingShare: Readonly<Record<PulledSeabed, number>> = {
  'soft-mud': 0.12,
  'firm-mud': 0.10,
  'stiff-clay': 0.25,
  'sandy-mud': 0.10,
  'loose-sand': 0.08,
  'hard-sand': 0.30,
  'gravel': 0.25,
  'cobble-over-sand': 0.35,
  'weed-over-sand': 0.25,
}

/** How a pull that moved ended: shares that broke out and that crept; the rest dragged steadily. Invented. */
export const endShares: Readonly<Record<PulledSeabed, { brokeOut: number, crept: number }>> = {
  'soft-mud': { brokeOut: 0.05, crept: 0.5 },
  'firm-mud': { brokeOut: 0.18, crept: 0.3 },
  'stiff-clay': { brokeOut: 0.4, crept: 0.1 },
  'sandy-mud': { brokeOut: 0.28, crept: 0.15 },
  'loose-sand': { brokeOut: 0.28, crept: 0.1 },
  'hard-sand': { brokeOut: 0.6, crept: 0.02 },
  'gravel': { brokeOut: 0.22, crept: 0.1 },
  'cobble-over-sand': { brokeOut: 0, crept: 0 },
  'weed-over-sand': { brokeOut: 0.4, crept: 0.05 },
}

/**
 * By family: how much readier than the seabed's share it breaks out; share that resets after a breakout; share that stays
 * buried in a veer pull; share of the others that reset in one. Invented.
 */
export interface FamilyTemper { breakoutFactor: number, reset: number, veerStays: number, veerResets: number }
export const familyTemper: Readonly<Partial<Record<Family, FamilyTemper>>> = {
  'hinged-plough': { breakoutFactor: 0.8, reset: 0.6, veerStays: 0.75, veerResets: 0.6 },
  'fixed-plough': { breakoutFactor: 0.9, reset: 0.65, veerStays: 0.72, veerResets: 0.65 },
  'claw': { breakoutFactor: 0.5, reset: 0.85, veerStays: 0.85, veerResets: 0.8 },
  'pivoting-fluke': { breakoutFactor: 1.4, reset: 0.35, veerStays: 0.45, veerResets: 0.35 },
  'light-alloy-pivoting-fluke': { breakoutFactor: 1.5, reset: 0.3, veerStays: 0.4, veerResets: 0.3 },
  'roll-bar-scoop': { breakoutFactor: 0.8, reset: 0.85, veerStays: 0.85, veerResets: 0.85 },
  'weighted-tip-scoop': { breakoutFactor: 0.8, reset: 0.85, veerStays: 0.86, veerResets: 0.85 },
  'plain-scoop': { breakoutFactor: 1, reset: 0.7, veerStays: 0.8, veerResets: 0.7 },
  'fisherman': { breakoutFactor: 1, reset: 0.4, veerStays: 0.6, veerResets: 0.35 },
}

/** What the seabed takes off the two reset shares. Invented. */
export const resetPenalty: Readonly<Record<PulledSeabed, number>> = {
  'soft-mud': 0,
  'firm-mud': 0.05,
  'stiff-clay': 0.2,
  'sandy-mud': 0,
  'loose-sand': 0,
  'hard-sand': 0.2,
  'gravel': 0.1,
  'cobble-over-sand': 0,
  'weed-over-sand': 0.25,
}
