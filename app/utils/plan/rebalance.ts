import type { UnitSystem } from '#shared/units/systems'
import { readMix } from '~/utils/plan/shares'
import type { TypedBed } from '~/utils/plan/typed'

const typedShare = (share: number): string => `${Math.round(share * 100)} %`

/** Whole percentages that add up to 100: what rounding leaves goes to the largest. */
function inWholePercent(beds: readonly TypedBed[], shares: readonly number[]): TypedBed[] {
  const whole = shares.map(share => Math.round(share * 100))
  const left = 100 - whole.reduce((sum, share) => sum + share, 0)
  const largest = whole.indexOf(Math.max(...whole))
  return beds.map((bed, index) => ({ ...bed, share: typedShare(((whole[index] ?? 0) + (index === largest ? left : 0)) / 100) }))
}

/**
 * Adds a seabed with an equal share of the mix, the others giving way in proportion. Shares that do not add up are left as they are typed.
 */
export function addBed(beds: readonly TypedBed[], added: TypedBed['seabed'], system: UnitSystem): TypedBed[] {
  const next = [...beds, { seabed: added, share: '' }]
  if (beds.length === 0) return next
  const { mix, errors } = readMix(beds, system)
  if (errors.length > 0) return next
  const share = 1 / next.length
  return inWholePercent(next, [...mix.map(part => part.share * (1 - share)), share])
}

/** Takes one seabed out, the others growing in proportion; the last one left has the whole mix and no share of its own. */
export function removeBed(beds: readonly TypedBed[], index: number, system: UnitSystem): TypedBed[] {
  const next = beds.filter((_, place) => place !== index)
  const only = next[0]
  if (next.length === 1 && only) return [{ ...only, share: '' }]
  const { mix, errors } = readMix(beds, system)
  const kept = mix.filter((_, place) => place !== index)
  const sum = kept.reduce((total, { share }) => total + share, 0)
  return errors.length > 0 || sum <= 0 ? next : inWholePercent(next, kept.map(({ share }) => share / sum))
}
