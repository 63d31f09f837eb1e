import type { ChartConstituent } from '#shared/types/chart'
import type { Seabed } from '#shared/types/words'

/** Seabeds that one material may be when nothing says more, the worse first (ours). */
const plain: Readonly<Record<string, readonly Seabed[]>> = {
  sand: ['loose-sand', 'hard-sand'],
  mud: ['soft-mud', 'firm-mud'],
  clay: ['firm-mud', 'stiff-clay'],
  silt: ['silt'],
  stones: ['cobble-over-sand', 'gravel', 'rock'],
  gravel: ['gravel'],
  pebbles: ['gravel'],
  cobbles: ['cobble-over-sand', 'gravel'],
  rock: ['rock'],
  boulders: ['rock'],
  coral: ['coral'],
  shells: ['shell'],
  weed: ['thick-weed'],
  seagrass: ['seagrass'],
}

const soft: Readonly<Record<string, readonly Seabed[]>> = { sand: ['loose-sand'], mud: ['soft-mud'], clay: ['soft-mud'] }
const hard: Readonly<Record<string, readonly Seabed[]>> = { sand: ['hard-sand'], mud: ['firm-mud'], clay: ['stiff-clay'] }

const cohesive: ReadonlySet<string> = new Set(['mud', 'silt', 'clay'])
const stony: ReadonlySet<string> = new Set(['cobbles', 'pebbles', 'stones'])
const solid: ReadonlySet<string> = new Set(['rock', 'boulders', 'coral'])

/** Seabeds that one constituent may be, the worse first (ours): soft, stiff and hard narrow sand, mud and clay. */
export function candidates({ noun, qualifiers }: ChartConstituent): readonly Seabed[] {
  const narrowed = qualifiers.includes('soft') ? soft[noun] : qualifiers.some(word => word === 'hard' || word === 'stiff') ? hard[noun] : undefined
  return narrowed ?? plain[noun] ?? []
}

/** Seabeds that two constituents of one mixed material may be, main one first (ours). */
export function pairCandidates(main: ChartConstituent, second: ChartConstituent): readonly Seabed[] {
  const has = (noun: string): boolean => main.noun === noun || second.noun === noun
  const other = (noun: string): ChartConstituent => main.noun === noun ? second : main
  const both = [...candidates(main), ...candidates(second)]
  for (const noun of ['seagrass', 'coral', 'rock', 'boulders']) if (has(noun)) return [...candidates({ ...main, noun, qualifiers: [] }), ...both]
  if (has('weed')) return weedOver(other('weed')) ?? both
  if (has('sand') && has('mud')) return ['sandy-mud']
  if (has('sand') && cohesive.has(other('sand').noun)) return ['sandy-mud', ...both]
  if (stony.has(main.noun) && second.noun === 'sand') return ['cobble-over-sand', 'gravel']
  if (has('cobbles') && has('sand')) return ['cobble-over-sand', 'gravel', ...both]
  return both
}

/** Seabeds that a material lying on another may be; undefined where the upper one alone decides (ours). */
export function layerCandidates(upper: ChartConstituent, lower: ChartConstituent): readonly Seabed[] | undefined {
  if (upper.noun === 'weed') return weedOver(lower)
  if (stony.has(upper.noun) && lower.noun === 'sand') return ['cobble-over-sand', 'gravel']
  if (upper.noun === 'sand' && solid.has(lower.noun)) return ['thin-sand', ...candidates(upper)]
  return undefined
}

function weedOver(below: ChartConstituent): readonly Seabed[] | undefined {
  if (below.noun === 'sand') return ['weed-over-sand', 'thick-weed']
  return cohesive.has(below.noun) ? ['weed-over-mud', 'thick-weed'] : undefined
}
