/** Repeatable random numbers for tests: mulberry32, and normals from it by the polar method. */
export function makeRandom(start: number): { uniform: () => number, normal: () => number } {
  let state = start >>> 0
  const uniform = () => {
    state = (state + 0x6D2B79F5) >>> 0
    let t = state
    t = Math.imul(t ^ (t >>> 15), t | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296
  }
  const normal = () => {
    for (;;) {
      const u = 2 * uniform() - 1
      const v = 2 * uniform() - 1
      const s = u * u + v * v
      if (s > 0 && s < 1) return u * Math.sqrt(-2 * Math.log(s) / s)
    }
  }
  return { uniform, normal }
}
