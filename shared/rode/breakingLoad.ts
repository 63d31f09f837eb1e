import { solveRode, type RodeInput } from './catenary'
import type { Give } from './give'

/**
 * Horizontal load at which the first part of known strength breaks.
 *
 * @param input the rode; its own load is not read
 * @param breaking parts and their breaking strengths, N; an unknown strength sets no bound
 * @returns that load, N (0 where the rode's own weight breaks it, 1e9 where no strength is known), and the part that breaks
 * @throws FieldError as solveRode
 *
 * Source: ours, by halving the load.
 */
export function breakingLoad(input: RodeInput, breaking: Give['breaking']): { mostN: number, part: string } {
  const known = breaking.flatMap(({ part, breakingN }) => breakingN === null ? [] : [{ part, breakingN }])
  if (known.length === 0) return { mostN: 1e9, part: '' }
  const worstAt = (loadN: number) => {
    const shape = solveRode({ ...input, horizontalLoadN: loadN })
    const shares = known.map(({ part, breakingN }) =>
      ({ part, share: (part === 'chain' ? shape.tensionJoinN : shape.tensionBowN) / breakingN }))
    return shares.reduce((most, one) => one.share > most.share ? one : most, { part: '', share: 0 })
  }
  let low = 0
  let high = Math.min(1e9, Math.max(1, ...known.map(({ breakingN }) => breakingN)))
  for (let round = 0; round < 60 && high - low > 1e-9 * high; round += 1) {
    const middle = (low + high) / 2
    if (middle > 1e-6 && worstAt(middle).share > 1) high = middle
    else low = middle
  }
  return { mostN: low, part: worstAt(high).part }
}
