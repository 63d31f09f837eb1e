import { calibrationSd, pullEffects, sdNames } from '#shared/holding/effects'
import type { Effect, SdName } from '#shared/holding/effects'
import type { PullRecord } from '#shared/types/holding'

/** Prior sds of the effects that are not estimated from groups: mu_s about the centre, beta_s about the published exponent. */
export const seabedPriorSd = 2
export const exponentPriorSd = 0.1

/** One effect that some pull carries. */
export interface Column {
  key: string
  kind: Effect['kind']
  /** known prior sd; NaN for members of a group */
  priorSd: number
}

function priorSdOf(effect: Effect, pull: PullRecord): number {
  if (effect.kind === 'seabed') return seabedPriorSd
  if (effect.kind === 'exponent') return exponentPriorSd
  return effect.kind === 'rig' ? calibrationSd(pull) : NaN
}

/**
 * The effects before anchor-day effects that fitted pulls carry, by key.
 *
 * @param pulls pulls that enter the fit
 */
export function columnsOf(pulls: readonly PullRecord[]): Column[] {
  const found = new Map<string, Column>()
  for (const pull of pulls) {
    for (const effect of pullEffects(pull)) {
      if (!found.has(effect.key)) found.set(effect.key, { key: effect.key, kind: effect.kind, priorSd: priorSdOf(effect, pull) })
    }
  }
  return [...found.values()].sort((a, b) => (a.key < b.key ? -1 : 1))
}

/** Number of a kind's group, or -1 for kinds with a known prior. */
export function groupOf(kind: Effect['kind']): number {
  return sdNames.indexOf(kind as SdName)
}
