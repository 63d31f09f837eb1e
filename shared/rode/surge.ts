import type { Rode, SurgePeak } from '#shared/types/rode'
import { mustBeWithin } from '#shared/utils/fieldError'
import { breakingLoad } from './breakingLoad'
import { solveRode, type RodeInput } from './catenary'
import { elasticSpan } from './elasticSpan'
import { peakOn } from './energyPeak'
import { forceCurve } from './forceCurve'
import { giveOf, nothingLeft, type Give, type NoGive } from './give'
import { solverInput } from './weights'

/** Reads the peak for a steady load in N (0 to 1e9) and an energy in J (0 to 1e12): microseconds each. */
export type SurgeReader = (steadyN: number, energyJ: number) => SurgePeak

/** What surgePeak takes: the rode, seabed to bow in m, steady horizontal load in N, energy in J. */
export interface SurgeRequest { rode: Rode, heightM: number, steadyN: number, energyJ: number }

/**
 * Greatest horizontal load when the rode stops a surging boat: the integral of (H - H_s) dx equals the energy, x the span
 * with the lift of the chain and the stretch of chain, rope and snubber in series.
 *
 * @param request steadyN 0 to 1e9; energyJ 0 to 1e12, 0 giving the steady load itself
 * @returns the peak, or null with the reason: a stretch is unknown (its field is named), nothing in the rode stretches, or
 *   the peak would break its weakest part
 * @throws FieldError as solveRode, and for sizes or strengths out of range
 *
 * Source: energy balance; stiffnesses, see stiffness.ts.
 */
export function surgePeak({ rode, heightM, steadyN, energyJ }: SurgeRequest): SurgePeak {
  return surgeReader(rode, heightM)(steadyN, energyJ)
}

/**
 * The same for many loads and energies on one rode: the rode is worked out once, each reading takes microseconds.
 *
 * @param rode as given
 * @param heightM seabed to bow, m
 * @throws FieldError as surgePeak
 */
export function surgeReader(rode: Rode, heightM: number): SurgeReader {
  const input = solverInput(rode, heightM, 1)
  solveRode(input)
  const give = giveOf(rode)
  const read = 'why' in give ? () => ({ peakN: null, ...give }) : readerOf(input, give, rode.snubber !== undefined)
  return (steadyN, energyJ) => {
    mustBeWithin('steadyN', steadyN, 0, 1e9)
    mustBeWithin('energyJ', energyJ, 0, 1e12)
    return energyJ === 0 ? { peakN: steadyN } : read(steadyN, energyJ)
  }
}

function readerOf(input: RodeInput, { stretch, breaking }: Give, hasSnubber: boolean): SurgeReader {
  const { mostN, part } = breakingLoad(input, breaking)
  const remedy = hasSnubber ? nothingLeft.replace('a snubber', 'a longer or thicker snubber') : nothingLeft
  const broken: NoGive & { peakN: null } = { peakN: null, why: `${remedy} (the peak would break the ${part})` }
  if (mostN < 2) return () => broken
  const slackM = Math.max(0, input.chain.lengthM + (input.rope?.lengthM ?? 0) - input.heightM)
  const curve = forceCurve(loadN => elasticSpan({ ...input, horizontalLoadN: loadN }, stretch), slackM, mostN)
  return (steadyN, energyJ) => {
    const peakN = peakOn(curve, steadyN, energyJ)
    return peakN === null ? broken : { peakN }
  }
}
