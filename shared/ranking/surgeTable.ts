/** Peak of the surge above the gust's load (N) by that load (N); null where the rode cannot bound it. */
export type SurgeAt = (gustN: number) => number | null

const intervals = 32
/** Calm is taken as this share of the greatest gust load, since a rode without load has no shape. */
const calmShare = 1e-6

/** The greatest gust load that the rode still bounds, between one that it does and one that it does not. */
function lastBounded(surgeAt: SurgeAt, boundedN: number, unboundedN: number): number {
  let low = boundedN
  let high = unboundedN
  while (high - low > 1e-4 * high) {
    const middle = (low + high) / 2
    if (surgeAt(middle) === null) high = middle
    else low = middle
  }
  return low
}

/**
 * Tabulates the surge over equal steps of wind (of the root of the gust's load), so that a ranking solves it once per plan.
 *
 * @param surgeAt exact surge; once the rode cannot bound it, it cannot for any greater load
 * @param mostGustN greatest gust load of interest, N, more than 1
 * @returns the surge by gust load, linear between; null past the load where the rode stops bounding it
 */
export function tabulateSurge(surgeAt: SurgeAt, mostGustN: number): SurgeAt {
  const nodes: [gustN: number, surgeN: number][] = []
  for (let i = 0; i <= intervals; i++) {
    const gustN = mostGustN * Math.max(calmShare, (i / intervals) ** 2)
    const surgeN = surgeAt(gustN)
    const before = nodes[nodes.length - 1]
    if (surgeN !== null) nodes.push([gustN, surgeN])
    else {
      if (before === undefined) return () => null
      const limitN = lastBounded(surgeAt, before[0], gustN)
      if (limitN > before[0]) nodes.push([limitN, surgeAt(limitN) ?? before[1]])
      break
    }
  }
  return gustN => readSurge(nodes, mostGustN, gustN)
}

function readSurge(nodes: readonly (readonly [number, number])[], mostGustN: number, gustN: number): number | null {
  const lastNode = nodes[nodes.length - 1]
  if (lastNode === undefined) return null
  if (gustN >= lastNode[0]) {
    if (gustN === lastNode[0] || lastNode[0] >= mostGustN) return lastNode[1]
    return null
  }
  const root = Math.sqrt(Math.max(gustN, mostGustN * calmShare))
  const i = Math.min(Math.floor(intervals * root / Math.sqrt(mostGustN)), nodes.length - 2)
  const from = nodes[i]
  const to = nodes[i + 1]
  if (from === undefined || to === undefined) return lastNode[1]
  const share = (root - Math.sqrt(from[0])) / (Math.sqrt(to[0]) - Math.sqrt(from[0]))
  return from[1] + (to[1] - from[1]) * Math.max(0, share)
}
