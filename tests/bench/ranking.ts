// One ranking: 16 designs x 6 sizes x 4 seabeds, from the fit of the demo world.
import { makeWorld, pullRecords } from '../../seed/world'
import { fitHolding } from '../../shared/holding/fitHolding'
import { rankDesigns } from '../../shared/ranking/rank'
import type { RankingRequest } from '../../shared/types/ranking'
import { median, printTable } from './table.mjs'

const world = makeWorld()
const fit = { ...fitHolding(pullRecords(world)), id: 1, at: '2026-01-01T00:00:00.000Z' }
const catalogue = world.designs.slice(0, 16).map(({ slug, name, family }) => ({ slug, name, family, sizesKg: [7, 10, 15, 20, 30, 45] }))
const plan = (lengthM: number): RankingRequest => ({
  boat: { type: 'sailMonohull', lengthM, beamM: 0.32 * lengthM },
  wind: { speedMs: 15.43, kind: 'gust' },
  rode: { chain: { lengthM: 45, diameterMm: 10, grade: 'G40' }, snubber: { lengthM: 8, diameterMm: 14, construction: 'nylon3Strand' } },
  depthM: 8,
  massKg: 20,
  seabeds: (['soft-mud', 'sandy-mud', 'loose-sand', 'weed-over-sand'] as const).map(seabed => ({ seabed, share: 0.25 })),
})

const times = Array.from({ length: 60 }, (_, round) => {
  const began = performance.now()
  rankDesigns(plan(9 + round * 0.05), catalogue, fit)
  return performance.now() - began
}).slice(10)
printTable('One ranking, 16 designs x 6 sizes x 4 seabeds (aim: under 5 ms)', [
  { 'median ms': median(times).toFixed(2), 'slowest ms': Math.max(...times).toFixed(2), 'rankings': times.length },
])
