import { mayRead, type Actor } from '#shared/access/mayRead'
import { rankDesigns } from '#shared/ranking/rank'
import type { RankingAnswer, RankingRequest } from '#shared/types/ranking'
import { standingEvidence } from './standing'

/** What of a whole ranking an actor may read, as `may` decides it; `hidden` counts the rest. */
export function readableRanking(actor: Actor, whole: RankingAnswer, may: typeof mayRead = mayRead): RankingAnswer {
  const rows = whole.rows.filter((row, index) => may(actor, { what: 'rankingRow', place: row.rank ?? index + 1 }).allowed)
  const thin = whole.thin.filter(() => may(actor, { what: 'thinRow' }).allowed)
  const own = whole.own && may(actor, { what: 'ownRow' }).allowed ? whole.own : null
  const left = whole.rows.length - rows.length + whole.thin.length - thin.length
  return { ...whole, rows, thin, own, hidden: whole.hidden + left }
}

/** Ranks the designs for a plan. @throws FieldError naming what the calculation refuses; ApiError 503 while there is no fit */
export async function rankings(actor: Actor, request: RankingRequest): Promise<RankingAnswer> {
  const { fit, catalogue, rigs } = await standingEvidence()
  return readableRanking(actor, rankDesigns(request, catalogue, fit, { rigs }))
}
