import type { StoredFit } from '#shared/types/holding'
import type { CatalogueDesign, RankedRow, RankingAnswer, RankingRequest } from '#shared/types/ranking'
import { FieldError } from '#shared/utils/fieldError'
import { anchoringVariance } from '#shared/ranking/chance'
import { fitCautions } from '#shared/ranking/cautions'
import { mixWithEstimates, mostlyUnnumbered, type RankContext } from '#shared/ranking/context'
import { areTied, orderRows } from '#shared/ranking/order'
import { planGround } from '#shared/ranking/plan'
import { planDemand } from '#shared/ranking/planDemand'
import { buildRow, type Candidate } from '#shared/ranking/row'
import { judgeOwn } from '#shared/ranking/verdict'

/** The chance that a size is asked to reach where the reader names none. */
export const defaultTarget = 0.9

export interface RankOptions {
  /** how many rigs the fit's pulls came from; with one, the answer says that a common bias cannot be seen */
  rigs?: number
}

function numberRows(context: RankContext, ordered: readonly Candidate[]): RankedRow[] {
  return ordered.map(({ row }, i) => {
    const next = ordered[i + 1]?.row
    return { ...row, rank: i + 1, tiedWithNext: next !== undefined && areTied(context.mix, row, next) }
  })
}

function findOwn(request: RankingRequest, catalogue: readonly CatalogueDesign[]): CatalogueDesign | null {
  const { own } = request
  if (own === undefined) return null
  const design = catalogue.find(({ slug }) => slug === own.design)
  if (design === undefined) throw new FieldError('own.design', `own.design must be one of the designs listed, got ${own.design}`)
  return design
}

/** The reader's own anchor at its own mass; it carries a rank only where it stands in the ranking at that mass. */
function judgeOwnRow(context: RankContext, design: CatalogueDesign, ownMassKg: number, massKg: number, rows: readonly RankedRow[]): RankingAnswer['own'] {
  const candidate = buildRow(context, design, ownMassKg)
  const ranked = ownMassKg === massKg ? rows.find(row => row.design === design.slug) : undefined
  return { row: ranked ?? candidate.row, verdict: judgeOwn(context, candidate) }
}

/**
 * Ranks designs for a plan: POST /api/rankings. Every row stands at the same mass: the one asked for, else the reader's
 * own anchor's, else the rule table's for the boat. No ranking is given where the rode cannot bound the load, nor where
 * more than half of the mix has no number.
 *
 * @param request the plan, as the reader gives it
 * @param catalogue designs with their real sizes, slugs unique
 * @param fit one stored run of the model
 * @throws FieldError for an own design that is not in the catalogue, for a boat outside the rule table without a mass, and
 *   for whatever answerPlan refuses
 */
export function rankDesigns(
  request: RankingRequest, catalogue: readonly CatalogueDesign[], fit: StoredFit, options: RankOptions = {},
): RankingAnswer {
  const ownDesign = findOwn(request, catalogue)
  const plan = planGround(request)
  const { massKg, load, rode, ruleTables } = plan
  if (massKg === null) {
    throw new FieldError('massKg', 'massKg must be given: the boat lies outside the rule table, which ends at a mean length of 24 m')
  }
  const mix = mixWithEstimates(request.seabeds, fit)
  const answer: RankingAnswer = {
    load,
    rode,
    massKg,
    fit: { id: fit.id, modelVersion: fit.modelVersion, at: fit.at },
    cautions: [...plan.cautions, ...fitCautions(mix, options.rigs)],
    ruleTables,
    rows: [],
    thin: [],
    own: null,
    hidden: 0,
  }
  const demand = planDemand(request, plan)
  if (demand === null) return answer
  const context: RankContext = { demand, variance: anchoringVariance(fit.sigma, fit.sds), target: request.target ?? defaultTarget, mix }
  if (!mostlyUnnumbered(mix)) {
    const candidates = orderRows(catalogue.map(design => buildRow(context, design, massKg)), request.order ?? 'worst')
    answer.rows = numberRows(context, candidates.filter(({ ranked }) => ranked))
    answer.thin = candidates.filter(({ ranked }) => !ranked).map(({ row }) => row)
  }
  if (ownDesign !== null && request.own) answer.own = judgeOwnRow(context, ownDesign, request.own.massKg, massKg, answer.rows)
  return answer
}
