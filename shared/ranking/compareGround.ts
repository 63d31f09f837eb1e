import type { StoredFit } from '#shared/types/holding'
import type { ComparisonRequest } from '#shared/types/comparison'
import type { CatalogueDesign } from '#shared/types/ranking'
import { referenceMassKg } from '#shared/holding/predict'
import { FieldError } from '#shared/utils/fieldError'
import { fitCautions, standingCautions } from '#shared/ranking/cautions'
import { anchoringVariance } from '#shared/ranking/chance'
import { mixWithEstimates, type MixSeabed, type RankContext } from '#shared/ranking/context'
import { planGround } from '#shared/ranking/plan'
import { planDemand } from '#shared/ranking/planDemand'
import { withPlanFields } from '#shared/ranking/planFields'
import { inKg } from '#shared/ranking/plainWords'
import { defaultTarget } from '#shared/ranking/rank'

/** An anchor with everything settled: its design, its mass, what it is called in a sentence. */
export interface Contestant { design: CatalogueDesign, massKg: number, title: string }

/** What is compared for: a plan's mix and demand, or a flat pull wherever the anchors were pulled. */
export interface Ground { mix: MixSeabed[], context: RankContext | null, massKg: number, cautions: string[] }

/**
 * The anchors asked for, settled; a mass stands beside each name where they differ.
 *
 * @throws FieldError for a design that is not in the catalogue, or the same anchor twice
 */
export function contestantsOf({ anchors }: ComparisonRequest, commonKg: number, catalogue: readonly CatalogueDesign[]): Contestant[] {
  const found = anchors.map(({ design: slug, massKg = commonKg }, i) => {
    const design = catalogue.find(entry => entry.slug === slug)
    if (design === undefined) throw new FieldError(`anchors.${i}.design`, `anchors.${i}.design must be one of the designs listed, got ${slug}`)
    return { design, massKg }
  })
  const masses = new Set(found.map(({ massKg }) => massKg))
  return found.map(({ design, massKg }, i) => {
    if (found.some((other, j) => j < i && other.design === design && other.massKg === massKg)) {
      throw new FieldError(`anchors.${i}.design`, `anchors.${i}.design must not be compared with itself at the same mass`)
    }
    return { design, massKg, title: masses.size > 1 ? `${design.name} of ${inKg(massKg)}` : design.name }
  })
}

/** Without a plan: every seabed that any of the designs was pulled on, in the fit's order, each by itself. */
function flatGround({ anchors, massKg = referenceMassKg }: ComparisonRequest, fit: StoredFit): Ground {
  const wanted = new Set(anchors.map(({ design }) => design))
  const mix = fit.seabeds.filter(({ designs }) => designs.some(({ design, pulls }) => pulls > 0 && wanted.has(design)))
    .map(part => ({ seabed: part.seabed, share: 1, fit: part }))
  return { mix, context: null, massKg, cautions: [...standingCautions] }
}

/**
 * What the anchors are compared for.
 *
 * @param rigs how many rigs the fit's pulls came from; unknown when left out
 * @throws FieldError for whatever a plan refuses, its field after `plan.`
 */
export function groundOf(request: ComparisonRequest, fit: StoredFit, rigs?: number): Ground {
  const { plan } = request
  if (plan === undefined) {
    const flat = flatGround(request, fit)
    return { ...flat, cautions: [...flat.cautions, ...fitCautions([], rigs)] }
  }
  const ground = withPlanFields(() => planGround(plan))
  const mix = mixWithEstimates(plan.seabeds, fit)
  const demand = withPlanFields(() => planDemand(plan, ground))
  return {
    mix,
    context: demand && { demand, variance: anchoringVariance(fit.sigma, fit.sds), target: plan.target ?? defaultTarget, mix },
    massKg: request.massKg ?? ground.massKg ?? referenceMassKg,
    cautions: [...ground.cautions, ...fitCautions(mix, rigs)],
  }
}
