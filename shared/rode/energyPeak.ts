import { mustBeWithin } from '#shared/utils/fieldError'
import { lastNode, mostLoadN, pointAt, type ForceCurve } from './forceCurve'

/**
 * Energy that a rode takes up between a steady load and a peak, J: the integral of (H - H_s) dx.
 *
 * @param curve from forceCurve
 * @param steadyN steady horizontal load H_s, N, 0 to the curve's greatest
 * @param peakN peak, N, steadyN to the curve's greatest
 * @throws FieldError outside these
 *
 * Source: any text of mechanics.
 */
export function energyOn(curve: ForceCurve, steadyN: number, peakN: number): number {
  mustBeWithin('steadyN', steadyN, 0, mostLoadN(curve))
  mustBeWithin('peakN', peakN, steadyN, mostLoadN(curve))
  const from = pointAt(curve, steadyN)
  const to = pointAt(curve, peakN)
  return Math.max(0, to.workJ - from.workJ - steadyN * (to.spanM - from.spanM))
}

/**
 * Greatest load in a surge: the load up to which the rode takes up the energy.
 *
 * @param curve from forceCurve
 * @param steadyN steady horizontal load, N, 0 to 1e9
 * @param energyJ energy that the rode has to take up, J, 0 to 1e12
 * @returns peak horizontal load, N; null where it lies past the curve's greatest load
 * @throws FieldError outside these
 *
 * Source: energy balance, any text of mechanics; a part of the curve is a linear spring and solved as one.
 */
export function peakOn(curve: ForceCurve, steadyN: number, energyJ: number): number | null {
  mustBeWithin('steadyN', steadyN, 0, 1e9)
  mustBeWithin('energyJ', energyJ, 0, 1e12)
  if (steadyN > mostLoadN(curve)) return null
  const { loadsN, spansM, workJ } = curve
  const from = pointAt(curve, steadyN)
  const taken = (node: number) =>
    Math.max(0, (workJ[node] ?? 0) - from.workJ - steadyN * ((spansM[node] ?? 0) - from.spanM))
  if (energyJ > taken(loadsN.length - 1)) return null
  const node = lastNode(loadsN.length, at => at <= from.node || taken(at) <= energyJ)
  const lowN = Math.max(steadyN, loadsN[node] ?? 0)
  const leftJ = energyJ - (node > from.node ? taken(node) : 0)
  const highN = loadsN[node + 1] ?? lowN
  const giveMPerN = ((spansM[node + 1] ?? 0) - (spansM[node] ?? 0)) / (highN - (loadsN[node] ?? 0))
  if (!(leftJ > 0)) return lowN
  if (!(giveMPerN > 0)) return highN
  return Math.min(highN, steadyN + Math.sqrt((lowN - steadyN) ** 2 + 2 * leftJ / giveMPerN))
}
