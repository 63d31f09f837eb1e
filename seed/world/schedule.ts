import type { PulledSeabed } from './truth/holding'

/** What a day is for: designs side by side, a modification against its unmodified anchor, or one design at three masses. */
export type DayKind = 'designs' | 'pairs' | 'masses'

/** Place, general direction from the sound's middle in hundredths of a degree, and the seabed found there. */
export const places: Readonly<Record<PulledSeabed, { name: string, north: number, east: number }>> = {
  'soft-mud': { name: 'Pennock Pool', north: 3, east: -2 },
  'firm-mud': { name: 'Tarrack Bight', north: 2, east: 1 },
  'stiff-clay': { name: 'Old Brickfield', north: 4, east: 3 },
  'sandy-mud': { name: 'Cress Hole', north: 1, east: -1 },
  'loose-sand': { name: 'Hollin Roads', north: -1, east: 0 },
  'hard-sand': { name: 'Ouzel Bar', north: -3, east: 2 },
  'gravel': { name: 'Shingle Neb', north: -2, east: -3 },
  'cobble-over-sand': { name: 'Cobley Reach', north: 0, east: -5 },
  'weed-over-sand': { name: 'Dulse Garth', north: -2, east: 4 },
}

/** Day, seabed, what for, depth m, chain out m. */
export type ScheduledDay = readonly [string, PulledSeabed, DayKind, number, number]

/** The forty days, three seasons. Days with less chain than the rest lift it off the bottom at the rig's limit. */
export const schedule: readonly ScheduledDay[] = [
  ['2024-04-16', 'loose-sand', 'designs', 5.6, 70],
  ['2024-04-24', 'firm-mud', 'designs', 6.1, 70],
  ['2024-05-07', 'sandy-mud', 'designs', 5.2, 70],
  ['2024-05-15', 'loose-sand', 'masses', 6.0, 70],
  ['2024-05-29', 'hard-sand', 'designs', 4.8, 70],
  ['2024-06-05', 'soft-mud', 'designs', 4.6, 65],
  ['2024-06-18', 'stiff-clay', 'designs', 6.4, 70],
  ['2024-06-27', 'firm-mud', 'masses', 6.3, 70],
  ['2024-07-10', 'weed-over-sand', 'designs', 4.2, 65],
  ['2024-07-23', 'loose-sand', 'designs', 5.9, 70],
  ['2024-08-06', 'gravel', 'designs', 5.0, 70],
  ['2024-08-21', 'sandy-mud', 'pairs', 5.4, 70],
  ['2024-09-04', 'firm-mud', 'pairs', 6.0, 70],
  ['2025-04-09', 'hard-sand', 'designs', 5.1, 70],
  ['2025-04-22', 'firm-mud', 'designs', 6.2, 70],
  ['2025-05-01', 'soft-mud', 'pairs', 4.5, 65],
  ['2025-05-14', 'loose-sand', 'pairs', 5.7, 70],
  ['2025-05-28', 'cobble-over-sand', 'designs', 6.6, 75],
  ['2025-06-03', 'weed-over-sand', 'designs', 4.4, 65],
  ['2025-06-12', 'sandy-mud', 'designs', 5.3, 70],
  ['2025-06-25', 'sandy-mud', 'masses', 5.5, 70],
  ['2025-07-09', 'stiff-clay', 'designs', 6.7, 52],
  ['2025-07-16', 'loose-sand', 'designs', 7.8, 56],
  ['2025-07-30', 'hard-sand', 'designs', 7.6, 58],
  ['2025-08-13', 'firm-mud', 'pairs', 6.1, 70],
  ['2025-08-27', 'loose-sand', 'masses', 5.8, 70],
  ['2025-09-10', 'weed-over-sand', 'designs', 4.3, 65],
  ['2026-04-14', 'soft-mud', 'designs', 4.7, 65],
  ['2026-04-23', 'firm-mud', 'designs', 6.0, 70],
  ['2026-05-06', 'sandy-mud', 'pairs', 5.1, 70],
  ['2026-05-20', 'gravel', 'designs', 5.2, 70],
  ['2026-06-02', 'loose-sand', 'pairs', 5.6, 70],
  ['2026-06-11', 'hard-sand', 'designs', 5.0, 70],
  ['2026-06-24', 'cobble-over-sand', 'designs', 6.5, 75],
  ['2026-07-08', 'firm-mud', 'masses', 6.4, 70],
  ['2026-07-21', 'weed-over-sand', 'designs', 4.1, 65],
  ['2026-08-04', 'stiff-clay', 'designs', 6.3, 70],
  ['2026-08-19', 'soft-mud', 'pairs', 4.6, 65],
  ['2026-09-02', 'sandy-mud', 'designs', 5.4, 70],
  ['2026-09-16', 'loose-sand', 'designs', 6.0, 70],
]

/**
 * Who was pulled where on days of designs side by side. `never`: no pull there, ever. `thin`: on the seabed's first such day
 * only. The others `pulls` times on every such day, or on all but one where `restOne` is set.
 */
export interface Coverage { never: readonly string[], thin: readonly string[], pulls: number, restOne: boolean }

export const coverage: Readonly<Record<PulledSeabed, Coverage>> = {
  'soft-mud': { never: ['gorsetter', 'ebbwick', 'hobbrel', 'marrowby', 'yarrowmund'], thin: ['osterquill', 'orrelby'], pulls: 3, restOne: false },
  'firm-mud': { never: ['gorsetter'], thin: ['skelloway', 'hobbrel'], pulls: 2, restOne: false },
  'stiff-clay': {
    never: ['vennimore', 'skelloway', 'ebbwick', 'gorsetter', 'yarrowmund', 'orrelby', 'hobbrel'],
    thin: ['marrowby'],
    pulls: 3,
    restOne: false,
  },
  'sandy-mud': { never: ['ebbwick'], thin: ['vennimore', 'orrelby'], pulls: 2, restOne: false },
  'loose-sand': { never: [], thin: ['ebbwick', 'yarrowmund'], pulls: 2, restOne: false },
  'hard-sand': { never: ['pellifrond', 'vennimore', 'ebbwick', 'marrowby', 'orrelby'], thin: ['skelloway'], pulls: 3, restOne: true },
  'gravel': {
    never: ['vennimore', 'skelloway', 'orrelby', 'marrowby', 'yarrowmund', 'hobbrel', 'ebbwick'],
    thin: ['lapwistle', 'dunnavet', 'pellifrond'],
    pulls: 4,
    restOne: false,
  },
  'cobble-over-sand': {
    never: ['pellifrond', 'vennimore', 'skelloway', 'orrelby', 'marrowby', 'hobbrel', 'yarrowmund', 'ebbwick'],
    thin: ['haskettle', 'dunnavet'],
    pulls: 4,
    restOne: false,
  },
  'weed-over-sand': {
    never: ['pellifrond', 'skelloway', 'ebbwick', 'hobbrel', 'marrowby', 'yarrowmund'],
    thin: ['orrelby', 'dunnavet', 'vennimore'],
    pulls: 4,
    restOne: false,
  },
}

/** Designs pulled at three masses, and the masses with the pulls each gets on a day of masses. */
export const massDesigns = ['quennick', 'threlpin', 'dunnavet', 'ulvesk', 'fennigar'] as const
export const massPulls: readonly (readonly [number, number])[] = [[10, 2], [20, 1], [35, 2]]

/** Back-to-back pairs of each modification on a day of pairs. */
export const pairsPerDay = 3
