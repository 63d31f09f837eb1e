import type { RankingRequest } from '#shared/types/ranking'
import { KN_MS } from '#shared/units/constants'

/** An invented 11.2 m sail monohull on 45 m of 10 mm chain and an 8 m snubber in 8 m, in 30 kn of gusts. */
export function makePlan(more: Partial<RankingRequest> = {}): RankingRequest {
  return {
    boat: { type: 'sailMonohull', lengthM: 11.2, beamM: 3.6, displacementKg: 7400 },
    wind: { speedMs: 30 * KN_MS, kind: 'gust' },
    rode: { chain: { lengthM: 45, diameterMm: 10, grade: 'G40' }, snubber: { lengthM: 8, diameterMm: 14, construction: 'nylon3Strand' } },
    depthM: 8,
    seabeds: [{ seabed: 'loose-sand', share: 1 }],
    massKg: 20,
    ...more,
  }
}
