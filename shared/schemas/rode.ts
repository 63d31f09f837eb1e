import * as z from 'zod/mini'
import { chainGrades, ropeConstructions } from '#shared/types/words'
import { fieldsOf, listOf, oneOf, quantity, saying, yesOrNo } from './fields'

const sizeWords = saying('a size in inches such as 5/16')
const sizeIn = z.string(sizeWords).check(
  z.maxLength(20, sizeWords),
  z.regex(/^(?:(?:\d{1,2}[ -])?\d{1,2}\/\d{1,2}|\d{1,2}|\d{0,2}\.\d{1,4}) ?(?:["″]|in)?$/, sizeWords),
  z.describe('Nominal size in inches, such as 5/16'),
)
const breakingN = quantity(1, 20_000_000, 'N', 'Breaking strength')
const diameterMm = quantity(2, 120, 'mm', 'Nominal diameter')
const construction = z.optional(oneOf(ropeConstructions, 'Construction; unknown if left out, and so are its strength and stretch unless breakingN is given'))

interface Sized { diameterMm?: number | undefined, sizeIn?: string | undefined }

/** A size in mm or in inches, never both: they could disagree. */
const oneSize = <T extends Sized>() => z.superRefine<T>((part, context) => {
  if (part.diameterMm !== undefined && part.sizeIn !== undefined) {
    context.addIssue({ code: 'custom', path: ['sizeIn'], input: part.sizeIn, message: 'must be left out where diameterMm is given' })
  }
})

/** A piece that hangs in the water is weighed by its size or by the weight itself. */
const weighed = <T extends Sized & { lengthM: number, submergedWeightNPerM?: number | undefined }>() => z.superRefine<T>((part, context) => {
  if (part.lengthM > 0 && part.diameterMm === undefined && part.sizeIn === undefined && part.submergedWeightNPerM === undefined) {
    context.addIssue({ code: 'custom', path: ['diameterMm'], input: part, message: 'is missing: give diameterMm, sizeIn or submergedWeightNPerM' })
  }
})

export const chain = fieldsOf({
  lengthM: quantity(0, 2000, 'm', 'Length of chain out; 0 is allowed with a rope'),
  diameterMm: z.optional(diameterMm),
  sizeIn: z.optional(sizeIn),
  grade: z.optional(oneOf(chainGrades, 'Grade; sets the breaking strength where none is given')),
  breakingN: z.optional(breakingN),
  submergedWeightNPerM: z.optional(quantity(0.01, 5000, 'N/m', 'Weight in water; wins over a size')),
}, 'Chain').check(oneSize(), weighed())

export const rope = fieldsOf({
  lengthM: quantity(0.1, 2000, 'm', 'Length of rope out'),
  diameterMm: z.optional(diameterMm),
  sizeIn: z.optional(sizeIn),
  construction,
  breakingN: z.optional(breakingN),
  submergedWeightNPerM: z.optional(quantity(0, 500, 'N/m', 'Weight in water; wins over a size')),
}, 'Rope between chain and bow').check(oneSize(), weighed())

export const snubber = fieldsOf({
  lengthM: quantity(0.1, 200, 'm', 'Length of the snubber'),
  diameterMm: z.optional(diameterMm),
  sizeIn: z.optional(sizeIn),
  construction,
  breakingN: z.optional(breakingN),
}, 'The stretchy line that takes the load off the windlass').check(oneSize())

export const shackle = fieldsOf({
  sizeMm: z.optional(quantity(2, 120, 'mm', 'Nominal size')),
  sizeIn: z.optional(sizeIn),
  breakingN: z.optional(breakingN),
}, 'A shackle')

type Pieces = { chain: { lengthM: number }, rope?: unknown }

/** Chain may be left out only where rope takes its place. */
const something = <T extends Pieces>() => z.superRefine<T>((rode, context) => {
  if (rode.chain.lengthM === 0 && rode.rope === undefined) {
    context.addIssue({ code: 'custom', path: ['chain', 'lengthM'], input: 0, message: 'must be more than 0 m where there is no rope' })
  }
})

const pieces = { chain, rope: z.optional(rope), snubber: z.optional(snubber) }

export const rode = fieldsOf(pieces, 'Chain and rope from anchor to bow, with a snubber').check(something())

/** POST /api/rodes. */
export const rodeRequest = fieldsOf({
  heightM: quantity(0.1, 500, 'm', 'Seabed to bow'),
  horizontalLoadN: quantity(1, 5_000_000, 'N', 'Horizontal load at the bow'),
  ...pieces,
  shackles: z.optional(listOf(shackle, 1, 10, 'Shackles')),
  overRoller: z.optional(yesOrNo('The chain bends over a roller or gypsy under load; false if left out')),
}, 'A rode under a load: how does the pull reach the anchor?').check(something())
