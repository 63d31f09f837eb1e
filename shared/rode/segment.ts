/**
 * One uniform part of a hanging line between two points, in forms that keep their digits when the part weighs nothing,
 * lies flat or hangs straight down. Slopes are vertical over horizontal force (no unit), lower end first, 0 <= from <= to.
 *
 * Source: the catenary, V(s) = V0 + w s, H constant; the forms without a division by the weight are ours.
 */

/** Height gained along a part, m: (T1 - T0) / w written as length x (V0 + V1) / (T0 + T1). */
export function riseOver(lengthM: number, from: number, to: number): number {
  return lengthM * (from + to) / (Math.sqrt(1 + from * from) + Math.sqrt(1 + to * to))
}

/** What the height gained is short of the part's length, m: exact where the part hangs almost straight down. */
export function shortfallOver(lengthM: number, from: number, to: number): number {
  const low = Math.sqrt(1 + from * from)
  const high = Math.sqrt(1 + to * to)
  return lengthM * (1 / (low + from) + 1 / (high + to)) / (low + high)
}

/** How fast the height gained grows, m, when both slopes grow alike. */
export function riseGain(lengthM: number, from: number, to: number): number {
  const low = Math.sqrt(1 + from * from)
  const high = Math.sqrt(1 + to * to)
  return lengthM * turn(from, to, low, high) / (low * high)
}

/** Horizontal distance along a part, m: (H / w)(asinh V1/H - asinh V0/H), finite for a weightless part. */
export function spanOver(lengthM: number, from: number, to: number): number {
  const ratio = turn(from, to, Math.sqrt(1 + from * from), Math.sqrt(1 + to * to))
  const across = (to - from) * ratio
  const share = across < 1e-4 ? 1 - across * across / 6 : Math.asinh(across) / across
  return lengthM * ratio * share
}

/** (V0 + V1) H / (V1 T0 + V0 T1), which tends to 1 for a flat weightless part. */
function turn(from: number, to: number, low: number, high: number): number {
  return to === 0 ? 1 : (from + to) / (to * low + from * high)
}
