/**
 * Small seeded random numbers: the same key gives the same stream on every machine. Generator sfc32 (Chris Doty-Humphrey,
 * PractRand), key hashed with FNV-1a and the murmur3 finaliser; normals by Box and Muller (1958). Not for secrets.
 */
export interface RandomStream {
  /** uniform in (0, 1) */
  uniform(): number
  /** standard normal */
  normal(): number
  /** true with chance p, 0 to 1 */
  chance(p: number): boolean
  /** one of the items, each as likely as the next */
  pick<T>(items: readonly T[]): T
  /** a shuffled copy (Fisher-Yates) */
  shuffle<T>(items: readonly T[]): T[]
}

function hash32(text: string, salt: number): number {
  let h = (0x811c9dc5 ^ salt) >>> 0
  for (let i = 0; i < text.length; i++) h = Math.imul(h ^ text.charCodeAt(i), 0x01000193)
  h = Math.imul(h ^ (h >>> 16), 0x85ebca6b)
  h = Math.imul(h ^ (h >>> 13), 0xc2b2ae35)
  return (h ^ (h >>> 16)) >>> 0
}

function sfc32(key: string): () => number {
  let a = hash32(key, 1)
  let b = hash32(key, 2)
  let c = hash32(key, 3)
  let counter = 1
  const next = () => {
    const t = (a + b + counter) | 0
    counter = (counter + 1) | 0
    a = b ^ (b >>> 9)
    b = (c + (c << 3)) | 0
    c = (c << 21) | (c >>> 11)
    c = (c + t) | 0
    return t >>> 0
  }
  for (let i = 0; i < 12; i++) next()
  return next
}

/** An independent stream for a key such as "seed/trial/3". Two different keys give unrelated streams. */
export function randomStream(key: string): RandomStream {
  const next = sfc32(key)
  const uniform = () => (next() + 0.5) / 4294967296
  const pick = <T>(items: readonly T[]): T => {
    const item = items[Math.floor(uniform() * items.length)]
    if (item === undefined) throw new RangeError(`pick needs at least one item, got ${items.length}`)
    return item
  }
  const shuffle = <T>(items: readonly T[]): T[] => {
    const left = [...items]
    const out: T[] = []
    while (left.length > 0) out.push(...left.splice(Math.floor(uniform() * left.length), 1))
    return out
  }
  return {
    uniform,
    normal: () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform()),
    chance: p => uniform() < p,
    pick,
    shuffle,
  }
}
