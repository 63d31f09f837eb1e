/** In which order to eliminate effects so that few places fill in, and which places those are. */
export interface EliminationOrder {
  /** place of each effect in the order */
  position: Int32Array
  /** for each place the later places that its elimination joins, rising */
  columns: Int32Array[]
}

function countBits(word: number): number {
  let x = word - ((word >>> 1) & 0x55555555)
  x = (x & 0x33333333) + ((x >>> 2) & 0x33333333)
  return Math.imul((x + (x >>> 4)) & 0x0f0f0f0f, 0x01010101) >>> 24
}

function degree(row: Uint32Array): number {
  let sum = 0
  for (const word of row) sum += countBits(word)
  return sum
}

function members(row: Uint32Array): number[] {
  const list: number[] = []
  row.forEach((word, w) => {
    for (let left = word; left !== 0; left &= left - 1) list.push(w * 32 + 31 - Math.clz32(left & -left))
  })
  return list
}

/** Neighbours of each effect as bits: those it meets in some list. */
function neighbours(size: number, meetings: Iterable<readonly number[]>): Uint32Array[] {
  const rows = Array.from({ length: size }, () => new Uint32Array(Math.ceil(size / 32)))
  for (const list of meetings) {
    for (const a of list) for (const b of list) if (a !== b) rows[a]![b >> 5]! |= 1 << (b & 31)
  }
  return rows
}

function fewest(degrees: Int32Array, last: readonly boolean[], left: Uint8Array): number {
  let best = -1
  for (let i = 0; i < degrees.length; i++) {
    if (left[i] === 0) continue
    const better = best < 0 || (last[i] === last[best] ? degrees[i]! < degrees[best]! : last[best]!)
    if (better) best = i
  }
  return best
}

/**
 * Minimum degree ordering: eliminate, again and again, the effect that is joined to the fewest others; its neighbours are then
 * joined to each other. Ties go to the lower number, so the order is always the same.
 * Source: D. Rose, A graph-theoretic study of the numerical solution of sparse positive definite systems, 1972.
 *
 * @param meetings lists of effects that occur together
 * @param last effects to be kept for the end
 */
export function eliminationOrder(size: number, meetings: Iterable<readonly number[]>, last: readonly boolean[]): EliminationOrder {
  const rows = neighbours(size, meetings)
  const degrees = Int32Array.from(rows, degree)
  const left = new Uint8Array(size).fill(1)
  const position = new Int32Array(size)
  const joined: number[][] = []
  for (let place = 0; place < size; place++) {
    const chosen = fewest(degrees, last, left)
    const own = members(rows[chosen]!)
    left[chosen] = 0
    position[chosen] = place
    joined.push(own)
    for (const other of own) {
      const row = rows[other]!
      rows[chosen]!.forEach((word, w) => (row[w]! |= word))
      row[other >> 5]! &= ~(1 << (other & 31))
      row[chosen >> 5]! &= ~(1 << (chosen & 31))
      degrees[other] = degree(row)
    }
  }
  return { position, columns: joined.map(list => Int32Array.from(list, one => position[one]!).sort()) }
}
