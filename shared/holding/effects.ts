import { sizeExponent } from '#shared/seabed/seabeds'
import type { HoldingSds, PullRecord } from '#shared/types/holding'
import type { Family, NumberedSeabed } from '#shared/types/words'

/** Mass that every estimate is given at, kg. */
export const referenceMassKg = 15

/** Groups of random effects, in the order the solver knows them. */
export const sdNames = [
  'family', 'design', 'designSeabed', 'modification', 'modificationSeabed', 'trial', 'anchorDay',
] as const satisfies readonly (keyof HoldingSds)[]
export type SdName = (typeof sdNames)[number]

/** Kinds of effects with a prior of known spread: seabed means, their exponents, rigs. */
export type KnownKind = 'seabed' | 'exponent' | 'rig'

/** One effect of a pull: what kind, which one, and by how much it enters ln H. */
export interface Effect {
  kind: SdName | KnownKind
  key: string
  coefficient: number
}

/** What a mean is asked for: a design, perhaps modified, on a seabed. */
export interface Cell {
  design: string
  family: Family
  seabed: NumberedSeabed
  modification: string | null
}

function keyOf(kind: string, ...parts: readonly string[]): string {
  return JSON.stringify([kind, ...parts])
}

/** ln of mass over 15 kg. */
export function logMass(massKg: number): number {
  return Math.log(massKg / referenceMassKg)
}

/** The effects that make up a cell's ln holding at 15 kg beyond the centre: mu_s, f, a, g and for a modified anchor the two tau. */
export function cellEffects(cell: Cell): Effect[] {
  const { design, family, seabed, modification } = cell
  const effects: Effect[] = [
    { kind: 'seabed', key: keyOf('seabed', seabed), coefficient: 1 },
    { kind: 'family', key: keyOf('family', family, seabed), coefficient: 1 },
    { kind: 'design', key: keyOf('design', design), coefficient: 1 },
    { kind: 'designSeabed', key: keyOf('designSeabed', design, seabed), coefficient: 1 },
  ]
  return modification === null ? effects : [...effects, ...modificationEffects(design, modification, seabed)]
}

/** tau_{d,q} and tau_{d,q,s}: what a modification does to a design everywhere, and beyond that on this seabed. */
export function modificationEffects(design: string, modification: string, seabed: NumberedSeabed): Effect[] {
  return [
    { kind: 'modification', key: keyOf('modification', design, modification), coefficient: 1 },
    { kind: 'modificationSeabed', key: keyOf('modificationSeabed', design, modification, seabed), coefficient: 1 },
  ]
}

/** beta_s: how far the seabed's exponent departs from the published one. */
export function exponentEffect(seabed: NumberedSeabed, massKg: number): Effect {
  return { kind: 'exponent', key: keyOf('exponent', seabed), coefficient: logMass(massKg) }
}

/** Every effect of a pull but its anchor-day. A rig without calibration error has none. */
export function pullEffects(pull: PullRecord): Effect[] {
  const effects = [
    ...cellEffects({ ...pull, modification: pull.modification ?? null }),
    exponentEffect(pull.seabed, pull.massKg),
    { kind: 'trial' as const, key: keyOf('trial', pull.trial), coefficient: 1 },
  ]
  if (pull.rig !== undefined && calibrationSd(pull) > 0) {
    effects.push({ kind: 'rig', key: keyOf('rig', pull.rig), coefficient: 1 })
  }
  return effects
}

/** Sd of a rig's calibration error in ln load: 0.10 where none is given (ours), 0 without a rig. */
export function calibrationSd(pull: PullRecord): number {
  return pull.rig === undefined ? 0 : pull.calibrationSd ?? 0.1
}

/** The anchor's own day: one design in one trial. */
export function anchorDayKey(pull: PullRecord): string {
  return keyOf('anchorDay', pull.trial, pull.design)
}

/** b_s ln(m/15 kg): the published part of the dependence on mass. */
export function publishedSize(pull: PullRecord): number {
  return sizeExponent(pull.seabed) * logMass(pull.massKg)
}
