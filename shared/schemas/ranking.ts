import * as z from 'zod/mini'
import { rankingOrders, seabeds as seabedWords, targets } from '#shared/types/words'
import { boat } from './boat'
import { fieldsOf, listOf, oneOf, oneOfNumbers, quantity, slug } from './fields'
import { currentMs, swell, wind } from './load'
import { rode } from './rode'

export const massKg = quantity(0.5, 2000, 'kg', 'Mass of the anchor')

export const seabedShare = fieldsOf({
  seabed: oneOf(seabedWords, 'Seabed'),
  share: quantity(0.001, 1, '', 'Chance that the anchor lands on it'),
}, 'A seabed of the anchorage and its share')

/** Shares may be rounded by whoever typed them: the sum may miss 1 by this much. */
export const shareTolerance = 0.01

/** The mix of seabeds: no seabed twice, shares that add up to 1. */
export const seabedMix = listOf(seabedShare, 1, seabedWords.length, 'Seabeds of the anchorage').check(z.superRefine((mix, context) => {
  const seen = new Set<string>()
  mix.forEach(({ seabed }, index) => {
    if (seen.has(seabed)) context.addIssue({ code: 'custom', path: [index, 'seabed'], input: seabed, message: 'must not be named twice' })
    seen.add(seabed)
  })
  const sum = mix.reduce((total, { share }) => total + share, 0)
  if (Math.abs(sum - 1) > shareTolerance + 1e-9) {
    context.addIssue({ code: 'custom', input: mix, message: `must have shares that add up to 1 within ${shareTolerance}, not to ${Number(sum.toFixed(4))}` })
  }
}))

/** POST /api/rankings. */
export const rankingRequest = fieldsOf({
  boat,
  wind,
  currentMs: z.optional(currentMs),
  swell: z.optional(swell),
  rode,
  depthM: quantity(0.1, 300, 'm', 'Depth now, from the surface'),
  riseM: z.optional(quantity(0, 20, 'm', 'Rise of tide still to come; 0 if left out')),
  fallM: z.optional(quantity(0, 20, 'm', 'Fall of tide still to come; 0 if left out')),
  waveHeightM: z.optional(quantity(0, 15, 'm', 'Wave height; 0 if left out')),
  seabeds: seabedMix,
  own: z.optional(fieldsOf({ design: slug('Design of the anchor'), massKg }, 'The anchor that the sailor has')),
  massKg: z.optional(quantity(0.5, 2000, 'kg', 'Mass at which the rows are compared; the own anchor\'s, else the rule table\'s if left out')),
  target: z.optional(oneOfNumbers(targets, 'Chance that a size must reach; 0.9 if left out', ': the pulls cannot tell chances beyond 0.95 apart')),
  order: z.optional(oneOf(rankingOrders, 'By the worst seabed\'s holding wind, or by the share-weighted chance; worst if left out')),
}, 'A plan: which anchors hold here?')
