import { mustBeWithin } from '#shared/utils/fieldError'

/** A rode as a spring: span in m at rising horizontal loads in N, straight lines between; neither ever falls. */
export interface ForceCurve { readonly loadsN: Float64Array, readonly spansM: Float64Array, readonly workJ: Float64Array }

const nodes = 400
const firstN = 1

/**
 * Tabulates span against horizontal load, from no load to the greatest, with the work done from no load up.
 *
 * Straight lines between 400 loads in equal steps of their logarithm: a linear spring comes out exact, a rode within 1e-3
 * of its surge, and more energy or load never lowers a peak read from it.
 *
 * @param spanM span in m at a horizontal load in N, over 0; must not fall as the load grows
 * @param slackM span at no load, m
 * @param mostN greatest horizontal load, N, 2 to 1e9
 * @throws FieldError outside that
 *
 * Source: ours.
 */
export function forceCurve(spanM: (loadN: number) => number, slackM: number, mostN: number): ForceCurve {
  mustBeWithin('mostN', mostN, 2, 1e9)
  const loadsN = new Float64Array(nodes + 1)
  const spansM = new Float64Array(nodes + 1)
  const workJ = new Float64Array(nodes + 1)
  const ratio = Math.log(mostN / firstN) / (nodes - 1)
  let loadN = 0
  let reachM = slackM
  let work = 0
  spansM[0] = slackM
  for (let node = 1; node <= nodes; node += 1) {
    const nextN = node === nodes ? mostN : firstN * Math.exp(ratio * (node - 1))
    const nextM = Math.max(reachM, spanM(nextN))
    work += (loadN + nextN) / 2 * (nextM - reachM)
    loadN = nextN
    reachM = nextM
    loadsN[node] = loadN
    spansM[node] = reachM
    workJ[node] = work
  }
  return { loadsN, spansM, workJ }
}

/** Greatest load of a curve, N. */
export function mostLoadN({ loadsN }: ForceCurve): number {
  return loadsN[loadsN.length - 1] ?? 0
}

/** A place on a curve: the node at or below it, its span in m and the work up to it in J. */
export interface CurvePoint { node: number, spanM: number, workJ: number }

/** The place on a curve at a load, N, 0 to the curve's greatest. */
export function pointAt({ loadsN, spansM, workJ }: ForceCurve, loadN: number): CurvePoint {
  const node = lastNode(loadsN.length, at => (loadsN[at] ?? 0) <= loadN)
  const lowN = loadsN[node] ?? 0
  const lowM = spansM[node] ?? 0
  const share = (loadN - lowN) / ((loadsN[node + 1] ?? lowN) - lowN)
  const giveM = share * ((spansM[node + 1] ?? lowM) - lowM)
  return { node, spanM: lowM + giveM, workJ: (workJ[node] ?? 0) + (lowN + loadN) / 2 * giveM }
}

/** Last node that a condition holds for, by halving; the first at least, the one before the last at most. */
export function lastNode(count: number, holds: (node: number) => boolean): number {
  let low = 0
  let high = count - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (holds(middle)) low = middle
    else high = middle
  }
  return low
}
