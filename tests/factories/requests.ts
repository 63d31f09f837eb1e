import type { FitPull, FitRequest } from '../../shared/types/fit'
import type { LoadRequest } from '../../shared/types/load'
import type { RankingRequest } from '../../shared/types/ranking'
import type { RodeRequest } from '../../shared/types/rode'

/** A boat of 11 m with 40 m of 10-mm chain and a snubber: requests that are answered, to be spoilt one field at a time. */
const boat = { type: 'sailMonohull' as const, lengthM: 11, beamM: 3.5 }
const wind = { speedMs: 15.4, kind: 'gust' as const }
const chain = { lengthM: 40, diameterMm: 10, grade: 'G40' as const }
const snubber = { lengthM: 8, diameterMm: 16, construction: 'nylon3Strand' as const }

export const loadRequestExample = (): LoadRequest => structuredClone({
  boat: { ...boat, windage: [{ part: 'hull', areaM2: 4, dragCoefficient: 0.7 }], waterline: { lengthM: 9.7, beamM: 3, draughtM: 1.8 } },
  wind, currentMs: 0.5, swell: 'sheltered' as const, rode: { chain, snubber }, heightM: 8,
})

export const rodeRequestExample = (): RodeRequest => structuredClone({
  heightM: 8, horizontalLoadN: 2000, chain, rope: { lengthM: 20, diameterMm: 16 }, snubber, shackles: [{ sizeMm: 10 }], overRoller: true,
})

export const rankingRequestExample = (): RankingRequest => structuredClone({
  boat, wind, currentMs: 0.5, swell: 'none' as const, rode: { chain, snubber }, depthM: 6, riseM: 1.5, fallM: 0.5, waveHeightM: 0.3,
  seabeds: [{ seabed: 'firm-mud' as const, share: 0.6 }, { seabed: 'loose-sand' as const, share: 0.4 }], massKg: 15, target: 0.9 as const, order: 'worst' as const,
})

export const fitPullExample = (): FitPull => ({
  trial: 'first day', design: 'north', family: 'claw', massKg: 15, seabed: 'loose-sand', rig: 'winch', calibrationSd: 0.05, set: true,
  heldN: 2000, movedN: 2500, shankAngleDeg: 2,
})

/** Two designs on one seabed over three days. */
export const fitRequestExample = (): FitRequest => ({
  pulls: [0, 1, 2].flatMap(day => [0, 1, 2, 3].map(pull => ({
    ...fitPullExample(), trial: `day ${day}`, design: pull % 2 ? 'north' : 'south', heldN: 1500 + 200 * pull + 100 * day, movedN: pull === 3 ? null : 2000 + 200 * pull + 100 * day,
  }))),
})
