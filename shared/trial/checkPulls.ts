import type { PullRecord } from '#shared/types/holding'
import { inRange } from '#shared/units/range'

const greatestLoadN = 1e7

function checkLoads(pull: PullRecord, name: string): void {
  inRange(`${name}.heldN`, pull.heldN, 0, greatestLoadN)
  if (pull.movedN !== null) {
    inRange(`${name}.movedN`, pull.movedN, 0, greatestLoadN)
    if (pull.set && !(pull.movedN > pull.heldN)) {
      throw new RangeError(`${name}.movedN must be above heldN ${pull.heldN}, got ${pull.movedN}`)
    }
  }
  else if (pull.set && pull.heldN === 0) {
    throw new RangeError(`${name}.heldN must be above 0 where the anchor set and did not move, got 0`)
  }
}

function checkSetting(pull: PullRecord, name: string): void {
  const didSet = pull.setting === 'set' || pull.setting === 'setAfterDragging'
  if ((didSet && !pull.set) || (pull.setting === 'neverSet' && pull.set)) {
    throw new RangeError(`${name}.set must be ${didSet} where setting is ${pull.setting}, got ${pull.set}`)
  }
}

/**
 * Throws unless a pull can be read as an observation.
 *
 * @param name how the caller knows it, such as `pulls[3]`
 * @throws RangeError naming the field, the allowed interval and the value: mass 0.1 to 1e5 kg, loads 0 to 1e7 N with moved above
 * held, shank angle 0 to 90 degrees, calibration sd 0 to 1
 */
export function checkPull(pull: PullRecord, name: string): void {
  inRange(`${name}.massKg`, pull.massKg, 0.1, 1e5)
  inRange(`${name}.shankAngleDeg`, pull.shankAngleDeg, 0, 90)
  if (pull.calibrationSd !== undefined) inRange(`${name}.calibrationSd`, pull.calibrationSd, 0, 1)
  checkLoads(pull, name)
  checkSetting(pull, name)
}

/** Throws where one name means two things: a design of two families, or a rig with two calibration errors. */
function checkSame(seen: Map<string, unknown>, key: string, value: unknown, name: string): void {
  if (seen.has(key) && seen.get(key) !== value) {
    throw new RangeError(`${name} must be ${String(seen.get(key))} as before for ${key}, got ${String(value)}`)
  }
  seen.set(key, value)
}

/** Checks every pull, and that designs and rigs are the same thing throughout. @throws RangeError naming the first fault */
export function checkPulls(pulls: readonly PullRecord[]): void {
  const families = new Map<string, unknown>()
  const rigs = new Map<string, unknown>()
  pulls.forEach((pull, i) => {
    checkPull(pull, `pulls[${i}]`)
    checkSame(families, pull.design, pull.family, `pulls[${i}].family`)
    if (pull.rig !== undefined) checkSame(rigs, pull.rig, pull.calibrationSd ?? null, `pulls[${i}].calibrationSd`)
  })
}
