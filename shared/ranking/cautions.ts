import type { LoadAnswer } from '#shared/types/load'
import type { RankingRequest } from '#shared/types/ranking'
import type { RodeAnswer } from '#shared/types/rode'
import type { Seabed } from '#shared/types/words'
import { isNumbered, seabedFacts } from '#shared/seabed/seabeds'
import { shiftCaution } from '#shared/seabed/cautions'
import { shallowNote } from '#shared/rode/snubber'
import { upliftFactor, publishedUpliftLimitRad } from '#shared/rode/uplift'
import { mostlyUnnumbered, type MixSeabed } from '#shared/ranking/context'
import { inPercent } from '#shared/ranking/plainWords'

/** True of every plan, in the words the product always uses. */
export const standingCautions: readonly string[] = [
  'An estimate from short pulls on someone else\'s bottom. It is not a promise: keep an anchor watch.',
  'Assumes the anchor is set. Back down hard and watch a transit before you trust it.',
  shiftCaution,
  'Not for leaving the boat unattended, and not for named storms.',
  'The windlass is not a strong point. Take the load on a snubber or chain stopper made to a cleat or bitts.',
  'Holding is not strength: no pull here tested a shank sideways. Strong points, rode and shackles are for a surveyor or rigger to judge.',
  'Standards quoted from memory: check the current edition.',
]

export const stretchCaution = 'This rode has nothing left to stretch: fit a snubber.'
export const angleCaution = 'The shank is lifted past 15 degrees, further than anything published: the holding left is a guess. Lengthen the rode.'
export const oneTesterCaution = 'All pulls by one tester and one boat: a bias common to all of them cannot be seen.'
export const mostlyUnnumberedCaution = 'More than half of the mix has no holding figure: no ranking is given.'

/** Depth below which the shallow-water caution stands, m. */
const shallowM = 5

function named(seabed: Seabed, share: number): string {
  const { name } = seabedFacts(seabed)
  const title = name.charAt(0).toUpperCase() + name.slice(1)
  return `${title}, ${inPercent(share)} of the mix, has no holding figure: it counts as not held in the weighted chance, and not at all in the worst seabed.`
}

/** Cautions of a plan that need no estimates: those that always stand, then those of its load, rode, depth and seabeds. */
export function planCautions(request: Pick<RankingRequest, 'depthM' | 'seabeds'>, load: LoadAnswer, rode: RodeAnswer | null): string[] {
  const cautions = [...standingCautions]
  if (load.survey.surgeN === null) cautions.push(load.notes[load.notes.length - 1] ?? stretchCaution)
  if (request.depthM < shallowM) cautions.push(shallowNote)
  if (rode !== null && rode.upliftFactor < upliftFactor(publishedUpliftLimitRad)) cautions.push(angleCaution)
  for (const { seabed, share } of request.seabeds) {
    if (share > 0) cautions.push(...(isNumbered(seabed) ? [] : [named(seabed, share)]), ...seabedFacts(seabed).cautions)
  }
  return [...new Set(cautions)]
}

/**
 * Cautions that hang on the estimates: seabeds of the mix that the fit has no number for, with their share, and pulls that
 * all came from one rig.
 *
 * @param rigs how many rigs the pulls came from; unknown when left out
 */
export function fitCautions(mix: readonly MixSeabed[], rigs?: number): string[] {
  const cautions = mix.filter(({ fit, seabed }) => fit === null && isNumbered(seabed)).map(({ seabed, share }) => named(seabed, share))
  if (mostlyUnnumbered(mix)) cautions.push(mostlyUnnumberedCaution)
  if (rigs === 1) cautions.push(oneTesterCaution)
  return cautions
}
