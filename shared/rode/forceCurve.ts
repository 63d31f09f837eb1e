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

/** Last node at or below a load, found by halving; never the very last node. */
function nodeBelow(values: Float64Array, isBelow: (node: number) => boolean): number {
  let low = 0
  let high = values.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (isBelow(middle)) low = middle
    else high = middle
  }
  return low
}

/**
 * Greatest load in a surge: the energy equals the integral of (H - H_s) dx from the steady load H_s to the peak.
 *
 * @param curve from forceCurve
 * @param steadyN steady horizontal load, N, 0 to 1e9
 * @param energyJ energy that the rode has to take up, J, 0 to 1e12
 * @returns peak horizontal load, N; null where it lies past the curve's greatest load
 * @throws FieldError outside these
 *
 * Source: energy balance, see the integral; any text of mechanics.
 */
export function peakOn(curve: ForceCurve, steadyN: number, energyJ: number): number | null {
  mustBeWithin('steadyN', steadyN, 0, 1e9)
  mustBeWithin('energyJ', energyJ, 0, 1e12)
  const { loadsN, spansM, workJ } = curve
  const last = loadsN.length - 1
  if (steadyN > (loadsN[last] ?? 0)) return null
  const from = nodeBelow(loadsN, node => (loadsN[node] ?? 0) <= steadyN)
  const start = pointAt(curve, from, steadyN)
  const taken = (node: number) =>
    Math.max(0, (workJ[node] ?? 0) - start.workJ - steadyN * ((spansM[node] ?? 0) - start.spanM))
  if (energyJ > taken(last)) return null
  const to = Math.max(from, nodeBelow(loadsN, node => node <= from || taken(node) <= energyJ))
  const lowN = Math.max(steadyN, loadsN[to] ?? 0)
  const leftJ = energyJ - (to > from ? taken(to) : 0)
  const highN = loadsN[to + 1] ?? lowN
  const giveMPerN = ((spansM[to + 1] ?? 0) - (spansM[to] ?? 0)) / (highN - (loadsN[to] ?? 0))
  if (!(leftJ > 0)) return lowN
  if (!(giveMPerN > 0)) return highN
  return Math.min(highN, steadyN + Math.sqrt((lowN - steadyN) ** 2 + 2 * leftJ / giveMPerN))
}

function pointAt({ loadsN, spansM, workJ }: ForceCurve, node: number, loadN: number): { spanM: number, workJ: number } {
  const lowN = loadsN[node] ?? 0
  const lowM = spansM[node] ?? 0
  const share = (loadN - lowN) / ((loadsN[node + 1] ?? lowN) - lowN)
  const giveM = share * ((spansM[node + 1] ?? lowM) - lowM)
  return { spanM: lowM + giveM, workJ: (workJ[node] ?? 0) + (lowN + loadN) / 2 * giveM }
}
