import { mayRead, type Actor } from '#shared/access/mayRead'
import { predictAt } from '#shared/holding/predict'
import { tickAt } from '#shared/holding/tick'
import { scaledFrom } from '#shared/ranking/seabedRow'
import { z90 } from '#shared/stats/normal'
import type { DesignListing } from '#shared/types/catalogue'
import type { SeabedFit, StoredFit } from '#shared/types/holding'
import type { DesignAnswer, DesignOnSeabed, DesignsPage, DesignsQuery, FitName } from '#shared/types/reading'
import { designNames, findDesign, pageOfDesigns, pageSize } from '../db/queries/designPages'
import { mannerOf, modificationNames, pullsOfDesign, trialsOfDesign, type StripPull } from '../db/queries/readPulls'
import { notFound } from '../utils/problem'
import { database } from './application'
import { currentEvidence } from './evidence'

/** Ticks drawn a strip, and trials named, at most. */
const mostTicks = 200
const mostTrials = 12

export const nameOf = (fit: StoredFit | undefined): FitName | null => fit ? { id: fit.id, modelVersion: fit.modelVersion, at: fit.at } : null

/** A page of the designs. */
export async function designPage(actor: Actor, query: DesignsQuery): Promise<DesignsPage> {
  const evidence = await currentEvidence()
  const { total, designs } = await pageOfDesigns(database(), query, evidence?.fit.id ?? 0)
  return {
    designs: designs.filter(({ family }) => mayRead(actor, { what: 'design', family }).allowed),
    total, page: query.page ?? 1, pages: Math.ceil(total / pageSize),
  }
}

/** Every design's name. */
export async function namesOfDesigns(actor: Actor) {
  const all = await designNames(database())
  return { designs: all.filter(({ family }) => mayRead(actor, { what: 'design', family }).allowed).map(({ slug, name }) => ({ slug, name })) }
}

/** The mass that a design was pulled at most often; without pulls its size nearest to 15 kg. */
function usualMass({ sizes }: DesignListing, pulls: readonly StripPull[]): number {
  const counts = new Map<number, number>()
  for (const { massKg } of pulls) counts.set(massKg, (counts.get(massKg) ?? 0) + 1)
  const [most] = [...counts].sort((a, b) => b[1] - a[1] || a[0] - b[0])
  const [nearest] = sizes.map(({ massKg }) => massKg).sort((a, b) => Math.abs(a - 15) - Math.abs(b - 15))
  return most?.[0] ?? nearest ?? 15
}

function onSeabed(actor: Actor, fit: SeabedFit, slug: string, massKg: number, pulls: readonly StripPull[]): DesignOnSeabed | null {
  const { seabed } = fit
  const index = fit.designs.findIndex(({ design }) => design === slug)
  const estimate = fit.designs[index]
  if (!estimate) return null
  const { mean, variance } = predictAt(fit, index, massKg)
  const half = z90 * Math.sqrt(variance)
  const figures = mayRead(actor, { what: 'estimate', seabed }).allowed
  const ticks = mayRead(actor, { what: 'pulls', seabed }).allowed ? pulls.filter(pull => pull.seabed === seabed).map(pull => tickAt(fit, pull, massKg)) : []
  return {
    seabed,
    holdingN: figures ? { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) } : null,
    scaledFromKg: scaledFrom(estimate.massRangeKg, massKg),
    pulls: estimate.pulls, days: estimate.days, atLimit: estimate.atLimit,
    setShare: figures ? estimate.setShare : null,
    resetShare: figures ? estimate.resetShare : null,
    veerShare: figures ? estimate.veerShare : null,
    ticks: ticks.filter(tick => tick !== null),
  }
}

async function modificationsOf(actor: Actor, fit: StoredFit, slug: string): Promise<DesignAnswer['modifications']> {
  const own = fit.modifications.filter(({ design, seabed }) => design === slug && mayRead(actor, { what: 'estimate', seabed }).allowed)
  if (own.length === 0) return []
  const names = await modificationNames(database())
  return own.map(ratio => ({ ...ratio, name: names.get(ratio.modification) ?? ratio.modification }))
}

/**
 * A design: sizes, holding by seabed with its pulls, how they went. Six statements.
 *
 * @throws ApiError 404 where there is none of that name
 */
export async function designBySlug(actor: Actor, slug: string, wantedKg?: number): Promise<DesignAnswer> {
  const db = database()
  const [evidence, found] = [await currentEvidence(), await findDesign(db, slug)]
  if (!found || !mayRead(actor, { what: 'design', family: found.design.family }).allowed) throw notFound()
  const [pulls, manner, trials] = await Promise.all([pullsOfDesign(db, found.id, mostTicks), mannerOf(db, found.id), trialsOfDesign(db, found.id, mostTrials)])
  const massKg = wantedKg ?? usualMass(found.design, pulls)
  const fit = evidence?.fit
  return {
    design: found.design,
    massKg,
    fit: nameOf(fit),
    seabeds: (fit?.seabeds ?? []).map(part => onSeabed(actor, part, slug, massKg, pulls)).filter(part => part !== null),
    manner,
    modifications: fit ? await modificationsOf(actor, fit, slug) : [],
    trials,
  }
}
