import * as z from 'zod/mini'
import { families, numberedSeabeds } from '#shared/types/words'
import { mostEffects, mostPulls } from '#shared/types/fit'
import { fieldsOf, listOf, oneOf, quantity, saying, shortText, yesOrNo } from './fields'

const load = quantity(0, 5_000_000, 'N', 'Load')
const movedWords = saying('null (never moved) or a number between 0.001 and 5 000 000 N')

export const fitPull = fieldsOf({
  trial: shortText(80, 'Trial: one rig, one place, one day'),
  design: shortText(80, 'Design'),
  family: oneOf(families, 'Family of the design'),
  massKg: quantity(0.5, 2000, 'kg', 'Mass of the anchor'),
  seabed: oneOf(numberedSeabeds, 'Seabed'),
  modification: z.optional(shortText(80, 'Change made to the anchor for the trial')),
  rig: z.optional(shortText(80, 'Rig; without one no calibration error is taken')),
  calibrationSd: z.optional(quantity(0.001, 1, '', 'Standard deviation of the rig\'s calibration error in ln load; 0.10 if left out')),
  set: z.optional(yesOrNo('False: never set, counted but not fitted; true if left out')),
  heldN: load.check(z.describe('Greatest load held (N); 0 with set true: moved at the first step')),
  movedN: z.nullable(z.number(movedWords).check(z.minimum(0.001, movedWords), z.maximum(5_000_000, movedWords)))
    .check(z.describe('First load above at which it moved (N); null: the rig\'s limit, or stopped early')),
  shankAngleDeg: z.optional(quantity(0, 60, 'degrees', 'Shank angle of the trial; 0 if left out')),
}, 'One anchor set and loaded in steps').check(z.superRefine((pull, context) => {
  if (pull.set === false) return
  if (pull.movedN === null && pull.heldN === 0) {
    context.addIssue({ code: 'custom', path: ['heldN'], input: 0, message: 'must be more than 0 N where movedN is null and set is true: such a pull says nothing' })
  }
  if (pull.movedN !== null && pull.movedN <= pull.heldN) {
    context.addIssue({ code: 'custom', path: ['movedN'], input: pull.movedN, message: `must be more than heldN, ${pull.heldN} N` })
  }
}))

type Pull = z.output<typeof fitPull>

/** Effects of the model besides those of an anchor's day, of the pulls that set: two a seabed, and one each for families, designs and modifications, there and over all, trials and rigs. */
export function countEffects(pulls: readonly Pull[]): number {
  const effects = new Set<string>()
  for (const { trial, design, family, seabed, modification, rig, set } of pulls) {
    if (set === false) continue
    const names = [['mean', seabed], ['exponent', seabed], ['family', family, seabed], ['design', design], ['design', design, seabed], ['trial', trial]]
    if (modification !== undefined) names.push(['modification', design, modification], ['modification', design, modification, seabed])
    if (rig !== undefined) names.push(['rig', rig])
    names.forEach(name => effects.add(JSON.stringify(name)))
  }
  return effects.size
}

/** One name means one thing throughout: a design has one family, a rig one calibration error. */
const consistent = z.superRefine<Pull[]>((pulls, context) => {
  const families = new Map<string, string>()
  const rigs = new Map<string, number | undefined>()
  pulls.forEach(({ design, family, rig, calibrationSd }, index) => {
    const before = families.get(design) ?? family
    if (before !== family) context.addIssue({ code: 'custom', path: [index, 'family'], input: family, message: `must be ${before}, as before for this design` })
    families.set(design, before)
    if (rig === undefined) return
    if (rigs.has(rig) && rigs.get(rig) !== calibrationSd) {
      context.addIssue({ code: 'custom', path: [index, 'calibrationSd'], input: calibrationSd, message: `must be ${rigs.get(rig) ?? 'left out'}, as before for this rig` })
    }
    else {
      rigs.set(rig, calibrationSd)
    }
  })
})

const manageable = z.superRefine<Pull[]>((pulls, context) => {
  const effects = countEffects(pulls)
  if (effects > mostEffects) context.addIssue({ code: 'custom', input: pulls, message: `must not need more than ${mostEffects} effects besides those of an anchor's day; these need ${effects}` })
})

/** POST /api/fits: what would these pulls say? */
export const fitRequest = fieldsOf({
  pulls: listOf(fitPull, 1, mostPulls, 'Pulls').check(consistent, manageable),
  pooled: z.optional(yesOrNo('False: one free mean per design and seabed, nothing shared; true if left out')),
}, 'Pulls to fit; nothing is stored')
