import type { NumberedSeabed } from '../../../shared/types/words'

/** Seabeds that the demo world has pulls on. Silt, thin sand, shell and weed over mud exist without any. */
export const pulledSeabeds = [
  'soft-mud', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'gravel', 'cobble-over-sand', 'weed-over-sand',
] as const satisfies readonly NumberedSeabed[]
export type PulledSeabed = (typeof pulledSeabeds)[number]

type Row = readonly [number, number, number, number, number, number, number, number, number]

/**
 * True median holding at 20 kg, flat pull, kN, in the order of pulledSeabeds. Invented; magnitudes are common practice, no
 * source. The light-alloy designs are at their mud setting on soft mud, at their sand setting elsewhere.
 */
export const medianKnAt20Kg: Readonly<Record<string, Row>> = {
  orrelby: [1.0, 2.6, 4.0, 2.4, 2.4, 5.0, 1.4, 0.85, 0.9],
  quennick: [1.2, 3.1, 4.6, 3.0, 2.9, 5.6, 1.6, 0.95, 1.0],
  haskettle: [1.15, 3.3, 5.2, 3.4, 3.3, 6.4, 1.7, 1.0, 1.1],
  marrowby: [1.05, 2.9, 4.8, 2.9, 2.9, 6.0, 1.5, 0.9, 0.95],
  threlpin: [0.95, 2.3, 3.6, 2.0, 2.1, 4.3, 1.9, 1.15, 0.9],
  ebbwick: [0.9, 2.1, 3.2, 1.7, 1.7, 4.0, 1.7, 1.0, 0.8],
  dunnavet: [2.0, 4.6, 5.8, 4.6, 5.2, 7.0, 1.3, 0.8, 0.85],
  skelloway: [1.7, 3.9, 5.0, 3.9, 4.4, 6.2, 1.2, 0.75, 0.75],
  pellifrond: [4.6, 5.8, 7.6, 6.8, 7.8, 9.5, 1.6, 0.95, 1.0],
  vennimore: [2.8, 4.9, 6.4, 5.6, 6.3, 8.0, 1.35, 0.85, 0.8],
  cawdrith: [1.6, 4.7, 7.4, 5.2, 5.4, 10.0, 2.4, 1.25, 1.9],
  ulvesk: [1.5, 4.3, 6.8, 4.8, 4.9, 9.0, 2.2, 1.2, 1.7],
  hobbrel: [1.25, 3.4, 5.4, 3.6, 3.6, 7.2, 1.9, 1.05, 1.3],
  fennigar: [1.45, 4.5, 8.2, 4.9, 5.3, 11.0, 2.6, 1.35, 2.2],
  osterquill: [1.3, 3.8, 6.9, 4.2, 4.4, 9.4, 2.2, 1.2, 1.8],
  lapwistle: [1.7, 4.4, 6.6, 4.7, 4.8, 8.6, 2.1, 1.1, 1.6],
  yarrowmund: [1.35, 3.5, 5.6, 3.7, 3.7, 7.6, 1.8, 1.0, 1.2],
  gorsetter: [0.9, 2.0, 3.0, 1.5, 1.1, 4.2, 2.9, 1.45, 2.4],
}

/** The stated range of those medians, kN: light-alloy pivoting flukes on soft mud have their own. */
export const statedRangeKn: Readonly<Record<PulledSeabed, readonly [number, number]>> = {
  'soft-mud': [0.9, 2.2],
  'firm-mud': [2, 6],
  'stiff-clay': [3, 9],
  'sandy-mud': [1.5, 7],
  'loose-sand': [1.1, 8],
  'hard-sand': [4, 12],
  'gravel': [0.8, 3],
  'cobble-over-sand': [0.6, 1.5],
  'weed-over-sand': [0.5, 2.5],
}
export const statedRangeLightAlloySoftMudKn = [2.5, 5] as const

/**
 * True exponent of mass, b_s + beta_s: the published 0.92 (soft), 0.86 (mixed), 0.80 (hard) from UFC 4-159-03 tables 5-3
 * and 5-4 (memory), plus an invented departure.
 */
export const exponents: Readonly<Record<PulledSeabed, { published: number, departure: number }>> = {
  'soft-mud': { published: 0.92, departure: -0.04 },
  'firm-mud': { published: 0.92, departure: 0.03 },
  'stiff-clay': { published: 0.80, departure: -0.05 },
  'sandy-mud': { published: 0.86, departure: -0.03 },
  'loose-sand': { published: 0.80, departure: 0.04 },
  'hard-sand': { published: 0.80, departure: 0 },
  'gravel': { published: 0.80, departure: 0.05 },
  'cobble-over-sand': { published: 0.80, departure: 0 },
  'weed-over-sand': { published: 0.80, departure: -0.02 },
}

/** Sd of ln holding between pulls of one anchor on one day, 0.30 to 0.40 by seabed. Invented. */
export const pullSd: Readonly<Record<PulledSeabed, number>> = {
  'soft-mud': 0.30,
  'firm-mud': 0.32,
  'stiff-clay': 0.36,
  'sandy-mud': 0.34,
  'loose-sand': 0.34,
  'hard-sand': 0.40,
  'gravel': 0.38,
  'cobble-over-sand': 0.36,
  'weed-over-sand': 0.40,
}

/** Sd of ln holding between days of one anchor. Invented. */
export const anchorDaySd = 0.2
/** The rig's true error in ln load, within the sd it states: the same on every pull, so no number of pulls shrinks it. */
export const rigErrorLn = 0.02
/** A first pull of an anchor's day may break out at half of the next: its chance (not on mud or cobble), and the share. */
export const firstPullWeak = { chance: 0.08, share: 0.5 } as const
/** A pull after a breakout in the same deployment holds this share of a fresh one. Invented. */
export const notFreshShare = 0.9
