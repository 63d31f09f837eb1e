import type { Rode, Snubber, SnubberAdvice } from '#shared/types/rode'
import { mustBeWithin } from '#shared/utils/fieldError'
import { ropeBreakingN } from './breaking'
import { solveRode } from './catenary'
import { ropeStiffnessN } from './stiffness'
import { ropeAllowedN } from './strength'
import { surgePeak } from './surge'
import { shortestSnubber } from './shortestSnubber'
import { solverInput } from './weights'

/** What snubberAdvice takes: loads horizontal, N; designN null where the surge has no bound. */
export interface SnubberRequest {
  rode: Rode
  heightM: number
  /** depth of water now, m */
  depthM: number
  designN: number | null
  /** the load that the surge starts from, N */
  steadyN: number
  energyJ: number
}

export const shallowNote = 'Shallow water needs more scope and a longer snubber, not less.'
const shallowM = 5

/**
 * What a snubber does for a rode: its stretch at the design load, the surge's peak with and without it, its own strength,
 * and the shortest length that keeps its stretch in the surge under 15 %.
 *
 * @param request heightM seabed to bow, m; depthM 0 to 1000; designN over 0 or null; steadyN 0 to 1e9; energyJ 0 to 1e12
 * @returns figures and notes, see SnubberAdvice
 * @throws FieldError as solveRode, and for sizes or strengths out of range
 *
 * Source: stretch by stiffness.ts, strength by strength.ts; the 15 % and the note on shallow water, common practice, no source.
 */
export function snubberAdvice(request: SnubberRequest): SnubberAdvice {
  const { rode, heightM, depthM, designN, steadyN, energyJ } = request
  mustBeWithin('depthM', depthM, 0, 1000)
  const snubber = rode.snubber && rode.snubber.lengthM > 0 ? rode.snubber : undefined
  const bare: Rode = rode.rope ? { chain: rode.chain, rope: rode.rope } : { chain: rode.chain }
  const peakWithout = surgePeak({ rode: bare, heightM, steadyN, energyJ })
  const notes = depthM < shallowM ? [shallowNote] : []
  if (!snubber) return { ...unknown, peakWith: null, peakWithout, shortest: null, notes }
  const shortest = shortestSnubber({ rode: bare, snubber, heightM, steadyN, energyJ })
  if (shortest.note !== undefined) notes.unshift(shortest.note)
  return {
    ...strengthAt(rode, snubber, heightM, designN),
    peakWith: surgePeak({ rode, heightM, steadyN, energyJ }),
    peakWithout,
    shortest,
    notes,
  }
}

const unknown = { stretchM: null, stretchShare: null, breakingN: null, allowedN: null, ok: null }

function strengthAt(rode: Rode, snubber: Snubber, heightM: number, designN: number | null) {
  const breakingN = ropeBreakingN(snubber, 'snubber')
  if (breakingN === null) return unknown
  const allowedN = ropeAllowedN(breakingN)
  if (designN === null) return { ...unknown, breakingN, allowedN }
  const { tensionBowN } = solveRode(solverInput(rode, heightM, designN))
  const stretchShare = tensionBowN / ropeStiffnessN(breakingN)
  return { stretchM: stretchShare * snubber.lengthM, stretchShare, breakingN, allowedN, ok: tensionBowN <= allowedN }
}
