import type { WorldModification } from '../types'

/** Tried back to back on these seabeds. */
export const modificationSeabeds = ['soft-mud', 'firm-mud', 'sandy-mud', 'loose-sand'] as const

/** The four modifications, each to one invented design. */
export const modifications: readonly WorldModification[] = [
  {
    slug: 'shank-edge-blunted',
    design: 'fennigar',
    name: 'Shank edge blunted',
    description: 'A half-round bar welded along the leading edge of the shank, 16 mm across, against the sharp edge it leaves the works with.',
    addedMassKg: 1.1,
    priceMinor: 9500,
    currency: 'EUR',
    priceDate: '2026-09-01',
  },
  {
    slug: 'roll-bar-removed',
    design: 'ulvesk',
    name: 'Roll bar removed',
    description: 'The roll bar cut off flush and the stubs ground smooth; nothing added in its place.',
    addedMassKg: -1.9,
    priceMinor: 4500,
    currency: 'EUR',
    priceDate: '2026-09-01',
  },
  {
    slug: 'hinge-locked',
    design: 'quennick',
    name: 'Hinge locked',
    description: 'The hinge pinned in line with two plates and a through bolt, so that the plough no longer swivels.',
    addedMassKg: 0.8,
    priceMinor: 6000,
    currency: 'EUR',
    priceDate: '2026-09-01',
  },
  {
    slug: 'flukes-painted',
    design: 'dunnavet',
    name: 'Flukes painted',
    description: 'Two coats of smooth epoxy over the galvanising on both flukes: a change expected to make no difference.',
    addedMassKg: 0.1,
    priceMinor: 3500,
    currency: 'EUR',
    priceDate: '2026-09-01',
  },
]

/** True ratio of modified to unmodified holding, in the order of modificationSeabeds. Invented. */
export const modificationRatios: Readonly<Record<string, readonly [number, number, number, number]>> = {
  'shank-edge-blunted': [0.85, 0.58, 0.55, 0.62],
  'roll-bar-removed': [1.05, 1.02, 0.95, 0.90],
  'hinge-locked': [1.10, 1.40, 1.45, 1.35],
  'flukes-painted': [1, 1, 1, 1],
}
