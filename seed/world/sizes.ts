import type { WorldDesign, WorldSize } from './types'
import { designs } from './designs'

/** What a chandlery would list for a design: masses, the mass the trials carry, shape and price. All invented. */
interface Line {
  masses: readonly number[]
  testMassKg: number
  /** shank length, fluke width and overall height of a 1 kg anchor, mm: they grow with the cube root of the mass */
  shape: readonly [number, number, number]
  /** shank strength of a 1 kg anchor, N, growing with the 2/3 power of the mass; null: the maker states none */
  strengthN: number | null
  material: string
  finish: string
  stowsFlat: boolean
  /** price in EUR, fixed part and a kilogram */
  price: readonly [number, number]
}

const galvanised = 'hot-dip galvanised'
const mild = 'mild steel'

const lines: Readonly<Record<string, Line>> = {
  orrelby: { masses: [7, 11, 16, 20, 27, 34], testMassKg: 20, shape: [330, 118, 176], strengthN: null, material: 'cast and forged steel', finish: galvanised, stowsFlat: false, price: [60, 14] },
  quennick: { masses: [6, 10, 15, 20, 27, 35, 48], testMassKg: 20, shape: [322, 130, 170], strengthN: 1500, material: mild, finish: galvanised, stowsFlat: false, price: [55, 12] },
  haskettle: { masses: [6, 10, 16, 20, 25, 32, 40], testMassKg: 20, shape: [300, 128, 150], strengthN: 1650, material: mild, finish: galvanised, stowsFlat: false, price: [40, 11] },
  marrowby: { masses: [8, 12, 18, 24, 30], testMassKg: 18, shape: [296, 112, 148], strengthN: null, material: 'cast steel', finish: galvanised, stowsFlat: false, price: [45, 10] },
  threlpin: { masses: [5, 7.5, 10, 15, 20, 35, 50], testMassKg: 20, shape: [244, 176, 140], strengthN: null, material: 'cast steel', finish: galvanised, stowsFlat: false, price: [20, 5] },
  ebbwick: { masses: [5, 10, 15, 22], testMassKg: 22, shape: [238, 166, 142], strengthN: null, material: 'cast steel', finish: galvanised, stowsFlat: false, price: [12, 4] },
  dunnavet: { masses: [6, 10, 14, 20, 28, 35], testMassKg: 20, shape: [318, 262, 60], strengthN: 1300, material: mild, finish: galvanised, stowsFlat: true, price: [35, 9] },
  skelloway: { masses: [5, 8, 12, 18, 25], testMassKg: 18, shape: [312, 250, 56], strengthN: null, material: mild, finish: galvanised, stowsFlat: true, price: [20, 6] },
  pellifrond: { masses: [5, 7, 10, 15, 21, 30], testMassKg: 10, shape: [428, 372, 78], strengthN: 1900, material: 'aluminium alloy', finish: 'anodised', stowsFlat: true, price: [140, 46] },
  vennimore: { masses: [5, 8, 12, 18, 29], testMassKg: 12, shape: [410, 344, 74], strengthN: null, material: 'aluminium alloy', finish: 'bare', stowsFlat: true, price: [110, 38] },
  cawdrith: { masses: [6, 10, 15, 20, 25, 33, 45], testMassKg: 20, shape: [286, 158, 186], strengthN: 2300, material: 'high-tensile steel', finish: galvanised, stowsFlat: false, price: [120, 15] },
  ulvesk: { masses: [6, 10, 15, 20, 27, 35, 50], testMassKg: 20, shape: [290, 150, 190], strengthN: 2100, material: 'high-tensile steel', finish: galvanised, stowsFlat: false, price: [110, 14] },
  hobbrel: { masses: [8, 12, 16, 21, 30], testMassKg: 21, shape: [282, 154, 202], strengthN: null, material: mild, finish: galvanised, stowsFlat: false, price: [60, 9] },
  fennigar: { masses: [6, 10, 15, 20, 27, 35, 45], testMassKg: 20, shape: [294, 146, 158], strengthN: 1800, material: 'high-tensile steel', finish: galvanised, stowsFlat: false, price: [150, 21] },
  osterquill: { masses: [7, 12, 16, 21, 28, 40], testMassKg: 21, shape: [288, 142, 154], strengthN: 1700, material: 'stainless steel', finish: 'polished', stowsFlat: false, price: [280, 62] },
  lapwistle: { masses: [5, 9, 13, 18, 24, 33, 44], testMassKg: 18, shape: [292, 156, 164], strengthN: 2000, material: 'high-tensile steel', finish: galvanised, stowsFlat: false, price: [100, 15] },
  yarrowmund: { masses: [7, 11, 17, 23, 32], testMassKg: 17, shape: [284, 150, 150], strengthN: null, material: mild, finish: galvanised, stowsFlat: false, price: [70, 11] },
  gorsetter: { masses: [9, 14, 20, 30, 41], testMassKg: 20, shape: [352, 216, 248], strengthN: null, material: 'forged steel', finish: 'painted black', stowsFlat: true, price: [90, 13] },
}

/** Price date of the invented list. */
export const priceDate = '2026-09-01'

function lineOf(slug: string): Line {
  const line = lines[slug]
  if (!line) throw new RangeError(`design must be one of the demo world's, got ${slug}`)
  return line
}

/** Mass of the sample that the trials carry of a design, kg: one of its real sizes. */
export function testMassKg(design: string): number {
  return lineOf(design).testMassKg
}

function shackleHoleMm(massKg: number): number {
  if (massKg < 8) return 11
  if (massKg < 14) return 13
  if (massKg < 24) return 16
  return massKg < 38 ? 18 : 22
}

function sizeOf(design: WorldDesign, massKg: number): WorldSize {
  const line = lineOf(design.slug)
  const scale = Math.cbrt(massKg)
  const round5 = (mm: number) => Math.round(mm * scale / 5) * 5
  return {
    design: design.slug,
    massKg,
    shankLengthMm: round5(line.shape[0]),
    flukeWidthMm: round5(line.shape[1]),
    overallHeightMm: round5(line.shape[2]),
    shackleHoleMm: shackleHoleMm(massKg),
    material: line.material,
    shankStrengthN: line.strengthN === null ? null : Math.round(line.strengthN * scale * scale / 500) * 500,
    finish: line.finish,
    stowsFlat: line.stowsFlat,
    priceMinor: Math.round(line.price[0] + line.price[1] * massKg) * 100 - 5,
    currency: 'EUR',
    priceDate,
  }
}

/** Every real size of every design, lightest first within a design. No size is under 5 kg. */
export const sizes: readonly WorldSize[] = designs.flatMap(design =>
  lineOf(design.slug).masses.map(massKg => sizeOf(design, massKg)))
