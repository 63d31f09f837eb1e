/** A small seeded generator of random numbers for tests (mulberry32): the same seed gives the same numbers everywhere. */
export interface RandomNumbers {
  /** uniform on [0, 1) */
  uniform: () => number
  /** standard normal, by Box and Muller */
  normal: () => number
  /** whole number from 0 to below n */
  below: (n: number) => number
}

export function randomNumbers(seed: number): RandomNumbers {
  let state = seed | 0
  const uniform = (): number => {
    state = (state + 0x6d2b79f5) | 0
    let t = Math.imul(state ^ (state >>> 15), 1 | state)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32
  }
  return {
    uniform,
    normal: () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform()),
    below: n => Math.floor(uniform() * n),
  }
}
