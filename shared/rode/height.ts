import { FieldError, mustBeWithin } from '#shared/utils/fieldError'

/**
 * Height from seabed to bow that scope, angle and shape go by, m: depth now + rise to come + half the wave height + bow.
 *
 * @param depthM sounder's depth now, corrected to the surface, m, 0 to 1000
 * @param riseM rise of tide still to come, m, 0 to 20
 * @param waveHeightM height of the waves, m, 0 to 20
 * @param bowHeightM bow above the water, m, 0 to 30
 * @throws FieldError outside these
 *
 * Source: seamanship practice; half the wave height, ours.
 */
export function heightToBow(depthM: number, riseM: number, waveHeightM: number, bowHeightM: number): number {
  mustBeWithin('depthM', depthM, 0, 1000)
  mustBeWithin('riseM', riseM, 0, 20)
  mustBeWithin('waveHeightM', waveHeightM, 0, 20)
  mustBeWithin('bowHeightM', bowHeightM, 0, 30)
  return depthM + riseM + waveHeightM / 2 + bowHeightM
}

/**
 * Scope, no unit: rode out over the height from seabed to bow.
 *
 * @param lengthM chain and rope out, m, 0 or more
 * @param heightM seabed to bow, m, over 0
 * @throws FieldError outside these
 */
export function scopeOf(lengthM: number, heightM: number): number {
  mustBeWithin('lengthM', lengthM, 0, 1e7)
  mustBeWithin('heightM', heightM, 1e-6, 1e4)
  return lengthM / heightM
}

/**
 * Rode to let out for a scope, m.
 *
 * @param scope rode over height, no unit, 1 to 100
 * @param heightM seabed to bow, m, over 0
 * @throws FieldError outside these
 *
 * Source: US Sailing, Basic Keelboat, 5th ed., p. 84.
 */
export function lengthForScope(scope: number, heightM: number): number {
  mustBeWithin('scope', scope, 1, 100)
  mustBeWithin('heightM', heightM, 1e-6, 1e4)
  return scope * heightM
}

/** What the swing takes: depth now, fall of tide to come, bow height, rode out and length overall, m. */
export interface Swing { depthM: number, fallM: number, bowHeightM: number, rodeM: number, lengthOverallM: number }

/**
 * Radius of the circle that the stern can reach, m: length overall + the straight rode's reach at low water.
 *
 * @param swing depthM 0 to 1000; fallM 0 to 20; bowHeightM 0 to 30; rodeM 0 to 1e6; lengthOverallM 1 to 200
 * @throws FieldError outside these, and for a rode that does not reach the bottom even at low water
 *
 * Source: seamanship practice: length overall + sqrt(rode^2 - (depth + freeboard)^2); low water, ours.
 */
export function swingRadiusM(swing: Swing): number {
  const { depthM, fallM, bowHeightM, rodeM, lengthOverallM } = swing
  mustBeWithin('depthM', depthM, 0, 1000)
  mustBeWithin('fallM', fallM, 0, 20)
  mustBeWithin('bowHeightM', bowHeightM, 0, 30)
  mustBeWithin('rodeM', rodeM, 0, 1e6)
  mustBeWithin('lengthOverallM', lengthOverallM, 1, 200)
  const lowM = Math.max(0, depthM - fallM) + bowHeightM
  if (rodeM < lowM) {
    throw new FieldError('rodeM', `too short to reach the bottom: ${rodeM} m of rode, the height at low water is ${lowM} m`)
  }
  return lengthOverallM + Math.sqrt((rodeM - lowM) * (rodeM + lowM))
}

/**
 * Water under the keel at low water, m; negative where the boat takes the ground.
 *
 * @param depthM depth now, m, 0 to 1000
 * @param fallM fall of tide still to come, m, 0 to 20
 * @param draughtM draught, m, 0 to 20
 * @throws FieldError outside these
 */
export function clearanceM(depthM: number, fallM: number, draughtM: number): number {
  mustBeWithin('depthM', depthM, 0, 1000)
  mustBeWithin('fallM', fallM, 0, 20)
  mustBeWithin('draughtM', draughtM, 0, 20)
  return depthM - fallM - draughtM
}
