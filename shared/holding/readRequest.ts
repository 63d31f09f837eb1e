import { columnsOf } from '#shared/holding/columns'
import { heldInterval } from '#shared/trial/observation'
import { mostEffects, mostPulls, type FitPull } from '#shared/types/fit'
import type { PullRecord } from '#shared/types/holding'

/** A pull of a request as a record: set unless said otherwise, a flat pull unless an angle is given. */
export function recordOf(pull: FitPull): PullRecord {
  const { set = true, shankAngleDeg = 0, ...rest } = pull
  return { ...rest, set, shankAngleDeg }
}

/**
 * Number of effects before anchor-day effects that a fit of these pulls has: seabed means and exponents, families and designs on
 * seabeds, designs, modifications, trials, rigs. Pulls that enter no fit bring none.
 */
export function countEffects(pulls: readonly PullRecord[]): number {
  return columnsOf(pulls.filter(pull => heldInterval(pull) !== null)).length
}

/**
 * Throws where a request is past what one fit takes: 5 000 pulls, 1 000 effects before anchor-day effects.
 *
 * @throws RangeError naming pulls or effects, the allowed interval and the number
 */
export function checkSize(pulls: readonly PullRecord[]): void {
  if (pulls.length < 1 || pulls.length > mostPulls) {
    throw new RangeError(`pulls must be between 1 and ${mostPulls}, got ${pulls.length}`)
  }
  const effects = countEffects(pulls)
  if (effects > mostEffects) throw new RangeError(`effects must be between 0 and ${mostEffects}, got ${effects}`)
}
