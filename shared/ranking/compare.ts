import type { StoredFit } from '#shared/types/holding'
import type { ComparedAnchor, ComparedHolding, ComparedPair, ComparedSeabed, ComparisonAnswer, ComparisonRequest } from '#shared/types/comparison'
import type { CatalogueDesign } from '#shared/types/ranking'
import { lnDifferenceAt } from '#shared/holding/difference'
import { designIndex, predictAt } from '#shared/holding/predict'
import { z90 } from '#shared/stats/normal'
import { chanceAbove, chanceInOneTry, comparisonVerdict, ratioOf } from '#shared/ranking/compareChance'
import { contestantsOf, groundOf, type Contestant, type Ground } from '#shared/ranking/compareGround'
import { pairInWords, summaryOf, verdictsOf } from '#shared/ranking/compareWords'
import type { MixSeabed } from '#shared/ranking/context'
import { buildRow } from '#shared/ranking/row'
import { rankSeabed, scaledFrom } from '#shared/ranking/seabedRow'

/** One anchor on one seabed; null where the fit has no estimate of it there. */
function holdingOf({ context }: Ground, entry: MixSeabed, { design, massKg }: Contestant): ComparedHolding | null {
  const index = entry.fit === null ? -1 : designIndex(entry.fit, design.slug)
  const estimate = entry.fit?.designs[index]
  if (entry.fit === null || estimate === undefined) return null
  const { mean, variance } = predictAt(entry.fit, index, massKg)
  const half = z90 * Math.sqrt(variance)
  const ranked = context && rankSeabed(context, entry, design.slug, massKg)
  return {
    holdingN: { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) },
    chance: ranked?.chance ?? null,
    holdingWind: ranked?.holdingWind ?? null,
    setShare: estimate.setShare,
    resetShare: estimate.resetShare,
    veer: estimate.veerShare,
    pulls: estimate.pulls,
    days: estimate.days,
    atLimit: estimate.atLimit,
    scaledFromKg: scaledFrom(estimate.massRangeKg, massKg),
    ends: null,
  }
}

/** Every two of them that both have an estimate on a seabed. */
function pairsOn(entry: MixSeabed, contestants: readonly Contestant[], holdings: readonly (ComparedHolding | null)[], { sigma, sds }: StoredFit): ComparedPair[] {
  const { fit } = entry
  if (fit === null) return []
  const at = ({ design, massKg }: Contestant) => ({ index: designIndex(fit, design.slug), massKg })
  return contestants.flatMap((a, first) => contestants.slice(first + 1).flatMap((b, offset): ComparedPair[] => {
    const second = first + 1 + offset
    const [left, right] = [holdings[first], holdings[second]]
    if (!left || !right) return []
    const difference = lnDifferenceAt(fit, at(a), at(b))
    const chance = chanceAbove(difference)
    const verdict = comparisonVerdict(chance, left, right)
    const words = pairInWords([a.title, b.title], { chance, verdict }, entry.seabed)
    return [{ first, second, chance, oneTry: chanceInOneTry(difference, sigma, sds), ratio: ratioOf(difference), verdict, words }]
  }))
}

function anchorOf({ context }: Ground, { design, massKg }: Contestant): ComparedAnchor {
  const row = context && buildRow(context, design, massKg).row
  return {
    design: design.slug,
    name: design.name,
    family: design.family,
    massKg,
    size: null,
    worst: row?.worst ?? null,
    weightedChance: row?.weightedChance ?? null,
  }
}

/**
 * Compares two to four anchors: POST /api/comparisons. Per seabed of the plan (without one, per seabed that any of them was
 * pulled on, for a flat pull) the chance that one's true median holding is the higher, from the fit's joint covariance, with
 * the verdict in words. Sizes and how pulls ended are left null for whoever can read them from the database.
 *
 * @param request anchors with their masses, and perhaps a plan
 * @param catalogue designs with their real sizes, slugs unique
 * @param fit one stored run of the model
 * @param rigs how many rigs the pulls came from; unknown when left out
 * @throws FieldError for an unknown design, the same anchor twice, and whatever a plan refuses
 */
export function compareAnchors(request: ComparisonRequest, catalogue: readonly CatalogueDesign[], fit: StoredFit, rigs?: number): ComparisonAnswer {
  const ground = groundOf(request, fit, rigs)
  const contestants = contestantsOf(request, ground.massKg, catalogue)
  const seabeds = ground.mix.map((entry): ComparedSeabed => {
    const holdings = contestants.map(contestant => holdingOf(ground, entry, contestant))
    return { seabed: entry.seabed, share: request.plan ? entry.share : null, holdings, pairs: pairsOn(entry, contestants, holdings, fit) }
  })
  const titles = contestants.map(({ title }) => title)
  const summary = titles.flatMap((a, first) => titles.slice(first + 1).map((b, offset) => summaryOf([a, b], verdictsOf(seabeds, first, first + 1 + offset))))
  return {
    fit: { id: fit.id, modelVersion: fit.modelVersion, at: fit.at },
    massKg: ground.massKg,
    loadN: ground.context?.demand.surveyN ?? null,
    upliftFactor: ground.context?.demand.upliftFactor ?? null,
    anchors: contestants.map(contestant => anchorOf(ground, contestant)),
    seabeds,
    summary,
    cautions: ground.cautions,
    hidden: 0,
  }
}
