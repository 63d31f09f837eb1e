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

const inBlock: readonly Effect['kind'][] = ['seabed', 'exponent', 'family', 'designSeabed', 'modificationSeabed']

interface Found extends Column { seabeds: Set<string> }

function priorSdOf(effect: Effect, pull: PullRecord): number {
  if (effect.kind === 'seabed') return seabedPriorSd
  if (effect.kind === 'exponent') return exponentPriorSd
  return effect.kind === 'rig' ? calibrationSd(pull) : NaN
}

function find(pulls: readonly PullRecord[]): Found[] {
  const found = new Map<string, Found>()
  for (const pull of pulls) {
    for (const effect of pullEffects(pull)) {
      const one = found.get(effect.key)
        ?? { key: effect.key, kind: effect.kind, priorSd: priorSdOf(effect, pull), seabeds: new Set<string>() }
      one.seabeds.add(pull.seabed)
      found.set(effect.key, one)
    }
  }
  return [...found.values()]
}

/** Block of a column: its seabed, or '~' (after every slug) for what seabeds share; fixed effects last of all where asked. */
function blockOf(column: Found, fixedLast: boolean): string {
  if (fixedLast && (column.kind === 'seabed' || column.kind === 'exponent')) return '~~'
  const alone = inBlock.includes(column.kind) || (column.kind === 'trial' && column.seabeds.size === 1)
  return alone ? [...column.seabeds][0]! : '~'
}

/**
 * The effects before anchor-day effects that fitted pulls carry, in an order that keeps the solver's matrix nearly block by
 * block: first each seabed's own, then what several seabeds share.
 *
 * @param pulls pulls that enter the fit, in canonical order
 */
export function columnsOf(pulls: readonly PullRecord[], fixedLast = false): Column[] {
  const keyed = find(pulls).map(column => ({ column, sort: `${blockOf(column, fixedLast)}\n${column.key}` }))
  keyed.sort((a, b) => (a.sort < b.sort ? -1 : 1))
  return keyed.map(({ column: { key, kind, priorSd } }) => ({ key, kind, priorSd }))
}

/** Number of a kind's group, or -1 for kinds with a known prior. */
export function groupOf(kind: Effect['kind']): number {
  return sdNames.indexOf(kind as SdName)
}
