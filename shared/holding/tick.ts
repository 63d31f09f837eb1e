import type { PullRecord, SeabedFit } from '#shared/types/holding'
import type { PullTick } from '#shared/types/reading'
import { massFactor } from '#shared/holding/predict'
import { heldInterval, middleLoadN } from '#shared/trial/observation'
import { upliftFactor } from '#shared/rode/uplift'
import { DEG_RAD } from '#shared/units/constants'

type Pulled = Pick<PullRecord, 'set' | 'setting' | 'fresh' | 'heldN' | 'movedN' | 'shankAngleDeg' | 'massKg'>

/**
 * One pull as a tick beside an estimate: the middle of its interval, or what was held where the rig's limit ended it, brought
 * to a flat pull and to another mass by the seabed's exponent.
 *
 * @param massKg mass of the strip, kg, more than 0
 * @returns null for a pull that enters no fit: fouled, never set, or made after a breakout
 * @throws RangeError for a mass that is not positive
 */
export function tickAt(fit: SeabedFit, pull: Pulled, massKg: number): PullTick | null {
  const interval = heldInterval(pull as PullRecord)
  if (interval === null) return null
  const scale = massFactor(fit, massKg) / massFactor(fit, pull.massKg) / upliftFactor(pull.shankAngleDeg * DEG_RAD)
  return { loadN: middleLoadN(interval) * scale, atLimit: interval.movedN === Infinity }
}
