import type { Family, Seabed } from '#shared/types/words'

/** Who asks. Until there are accounts everybody is a visitor. */
export type Actor = { kind: 'visitor' }

export const visitor: Actor = { kind: 'visitor' }

/** What is asked for. */
export type Readable =
  /** a row of the ranking, by its place (1 the best) */
  | { what: 'rankingRow', place: number }
  /** the row of the sailor's own anchor with its verdict */
  | { what: 'ownRow' }
  /** a design with too little evidence to rank */
  | { what: 'thinRow' }
  /** a design or a seabed as the catalogue describes it */
  | { what: 'design', family: Family }
  | { what: 'seabed', seabed: Seabed }
  /** figures of holding on a seabed */
  | { what: 'estimate', seabed: Seabed }
  /** single pulls on a seabed, as ticks or in a trial's table */
  | { what: 'pulls', seabed: Seabed }
  /** a trial as its tester describes it */
  | { what: 'trial', slug: string }
  /** an edition of the data; `open` once its data are twelve months old */
  | { what: 'release', version: string, open: boolean }
  /** anchors compared on a seabed, and what a modification does there */
  | { what: 'comparison', seabed: Seabed }
  | { what: 'modification', seabed: Seabed }

export type Ability = { allowed: true } | { allowed: false, reason: string }

/**
 * May this actor read that? The one place that decides it, for the server's answers and for the page's buttons alike.
 * Everybody may read everything for now.
 *
 * @returns allowed, or denied with the reason in words
 */
export function mayRead(_actor: Actor, _what: Readable): Ability {
  return { allowed: true }
}
