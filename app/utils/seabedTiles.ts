import type { Seabed } from '#shared/types/words'

/**
 * One repeating tile per seabed, 36 x 24 units, after the lithology patterns of the FGDC geologic map standard: stipple for sand,
 * dashes for mud and clay, open circles for gravel and cobble, tufts for weed, hatch for rock. Density tells soft from hard.
 */
export interface SeabedTile { dots: string, lines: string }

type Point = readonly [x: number, y: number]

const dots = (...points: Point[]): string => points.map(([x, y]) => `M${x} ${y}h.01`).join('')
const dashes = (length: number, ...points: Point[]): string => points.map(([x, y]) => `M${x} ${y}h${length}`).join('')
const circles = (radius: number, ...points: Point[]): string =>
  points.map(([x, y]) => `M${x - radius} ${y}a${radius} ${radius} 0 1 0 ${2 * radius} 0a${radius} ${radius} 0 1 0 ${-2 * radius} 0`).join('')
const tufts = (height: number, ...points: Point[]): string =>
  points.map(([x, y]) => `M${x} ${y}v${-height}M${x} ${y}l${-height / 2} ${-height * 0.8}M${x} ${y}l${height / 2} ${-height * 0.8}`).join('')
const blades = (...points: Point[]): string => points.map(([x, y]) => `M${x} ${y}q-3 -5 0 -9M${x + 3} ${y}q3 -4 1 -8`).join('')
const hatch = 'M0 24L24 0M12 24L36 0M-6 6L0 0M30 30L36 24M24 24L36 12M0 12L12 0'

const looseStipple = dots([4, 5], [15, 3], [27, 6], [9, 12], [21, 14], [33, 12], [5, 20], [16, 21], [28, 20])
const denseStipple = dots([2, 3], [8, 5], [14, 2], [20, 4], [26, 2], [32, 5], [5, 9], [11, 10], [17, 8], [23, 10], [29, 9], [35, 10],
  [2, 15], [8, 14], [14, 16], [20, 15], [26, 14], [32, 16], [5, 21], [11, 20], [17, 22], [23, 20], [29, 21], [35, 20])
const fewDots = dots([4, 20], [14, 22], [24, 20], [33, 22])

export const seabedTiles: Readonly<Record<Seabed, SeabedTile>> = {
  'soft-mud': { dots: '', lines: dashes(7, [3, 6], [21, 12], [8, 19]) },
  'silt': { dots: dots([14, 5], [32, 11], [5, 17], [23, 20]), lines: dashes(5, [3, 5], [21, 5], [12, 12], [30, 18], [10, 19]) },
  'firm-mud': { dots: '', lines: dashes(9, [2, 4], [20, 4], [11, 10], [29, 10], [2, 16], [20, 16], [11, 22], [29, 22]) + dashes(2, [0, 10], [0, 22]) },
  'stiff-clay': { dots: '', lines: dashes(14, [1, 3], [19, 3], [10, 9], [1, 15], [19, 15], [10, 21]) + dashes(8, [28, 9], [0, 9], [28, 21], [0, 21]) },
  'sandy-mud': { dots: dots([15, 4], [33, 10], [8, 13], [25, 16], [15, 21]), lines: dashes(8, [3, 5], [20, 9], [2, 19], [24, 22]) },
  'loose-sand': { dots: looseStipple, lines: '' },
  'hard-sand': { dots: denseStipple, lines: '' },
  'thin-sand': { dots: dots([4, 3], [13, 5], [22, 3], [31, 5], [8, 9], [17, 8], [27, 9]), lines: 'M0 13h36M2 24l8 -8M14 24l8 -8M26 24l8 -8' },
  'gravel': { dots: dots([16, 4], [6, 13], [29, 22]), lines: circles(2.6, [6, 6], [26, 7], [15, 13], [33, 15], [7, 20], [21, 20]) },
  'cobble-over-sand': { dots: fewDots, lines: circles(4.5, [7, 8], [27, 7]) + circles(3.4, [17, 13]) },
  'shell': { dots: '', lines: 'M3 8a4 4 0 0 1 8 0zM21 6a4 4 0 0 1 8 0zM12 17a4 4 0 0 1 8 0zM28 20a4 4 0 0 1 8 0zM0 22a4 4 0 0 1 7 0' },
  'weed-over-sand': { dots: fewDots, lines: tufts(8, [8, 13], [26, 11]) },
  'weed-over-mud': { dots: '', lines: tufts(8, [8, 12], [26, 10]) + dashes(8, [3, 18], [21, 18], [12, 23]) },
  'thick-weed': { dots: '', lines: tufts(8, [5, 11], [14, 9], [23, 11], [32, 9], [10, 22], [19, 23], [28, 22]) },
  'seagrass': { dots: '', lines: blades([4, 11], [15, 10], [27, 11], [9, 23], [21, 22], [32, 23]) },
  'rock': { dots: '', lines: hatch },
  'coral': { dots: '', lines: 'M8 11V6M8 8L5 4M8 7L11 3M26 12V7M26 9L23 5M26 8L29 4M17 23V18M17 20L14 16M17 19L20 15M34 24V19M34 21L31 17' + circles(1.8, [16, 6], [6, 18]) },
}

/** Id of the SVG pattern that the layout draws for a seabed. */
export const patternId = (seabed: Seabed): string => `seabed-${seabed}`
