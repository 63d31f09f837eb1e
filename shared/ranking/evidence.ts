import type { RankedSeabed } from '#shared/types/ranking'

/** Least evidence a ranked design has on every numbered seabed of the mix (ours). */
export const leastPulls = 5
export const leastDays = 2

/** True for at least 5 pulls on at least 2 days. */
export function hasEvidence({ pulls, days }: Pick<RankedSeabed, 'pulls' | 'days'>): boolean {
  return pulls >= leastPulls && days >= leastDays
}
