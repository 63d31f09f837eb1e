import { mayRead, type Actor } from '#shared/access/mayRead'
import { cohesiveNote } from '#shared/holding/cohesive'
import { modificationRatio } from '#shared/holding/ratios'
import { modificationWorth } from '#shared/ranking/modificationWorth'
import type { ModificationEstimate, StoredFit } from '#shared/types/holding'
import type {
  ModificationAnswer, ModificationListing, ModificationsAnswer, ModificationWorthAnswer, ModificationWorthRequest,
} from '#shared/types/modification'
import type { CatalogueDesign, RankingRequest } from '#shared/types/ranking'
import { sizesOf } from '../db/queries/comparePulls'
import { findModification, listModifications, pairsOf, type ModificationFacts } from '../db/queries/modifications'
import { notFound } from '../utils/problem'
import { database } from './application'
import { referencePlan } from './referenceBoats'
import { standingEvidence } from './standing'

/** Pairs shown on one page at most. */
const mostPairs = 120

/** The boat and rode of the reference boats, an 11 m sail monohull in 30 kn of gusts on a flat pull, with an anchor of 20 kg. */
const reference: RankingRequest = { ...referencePlan(11, 3.5, 'loose-sand'), massKg: 20 }

const nameOf = ({ id, modelVersion, at }: StoredFit) => ({ id, modelVersion, at })

/** What the fit says of one modification, as far as the actor may read it. */
function readableOf(actor: Actor, fit: StoredFit, slug: string): { estimates: ModificationEstimate[], hidden: number } {
  const own = fit.modifications.filter(({ modification }) => modification === slug)
  const estimates = own.filter(({ seabed }) => mayRead(actor, { what: 'modification', seabed }).allowed)
  return { estimates, hidden: own.length - estimates.length }
}

function listing(facts: ModificationFacts, estimates: readonly ModificationEstimate[], catalogue: readonly CatalogueDesign[]): ModificationListing {
  const slugs = [...new Set(estimates.map(({ design }) => design))]
  return {
    ...facts,
    designs: slugs.map(slug => ({ slug, name: catalogue.find(design => design.slug === slug)?.name ?? slug })),
    ratios: estimates.map(modificationRatio),
  }
}

/** Every modification with what the pulls say of it. One statement. @throws ApiError 503 while there is no fit */
export async function modifications(actor: Actor): Promise<ModificationsAnswer> {
  const { fit, catalogue } = await standingEvidence()
  const read = (await listModifications(database())).map(facts => ({ facts, ...readableOf(actor, fit, facts.slug) }))
  return {
    fit: nameOf(fit),
    modifications: read.map(({ facts, estimates }) => listing(facts, estimates, catalogue)),
    hidden: read.reduce((sum, { hidden }) => sum + hidden, 0),
  }
}

/** What mud says against sand: a sentence a design, its name in front where the change was tried on several. */
function cohesiveOf({ designs, ratios }: ModificationListing): string | null {
  const notes = designs.flatMap(({ slug, name }) => {
    const note = cohesiveNote(ratios.filter(({ design }) => design === slug))
    return note === null ? [] : [designs.length > 1 ? `${name}: ${note}` : note]
  })
  return notes.length > 0 ? notes.join(' ') : null
}

/** One modification, with the pairs behind it and its worth for the reference plan. Four statements. @throws ApiError 404 where there is none; 503 while there is no fit */
export async function modification(actor: Actor, slug: string): Promise<ModificationAnswer> {
  const { fit, catalogue } = await standingEvidence()
  const facts = await findModification(database(), slug)
  if (!facts) throw notFound()
  const { estimates, hidden } = readableOf(actor, fit, slug)
  const listed = listing(facts, estimates, catalogue)
  const [{ pairs, inAll }, sizes] = [await pairsOf(database(), slug, mostPairs), await sizesOf(database(), listed.designs.map(design => design.slug))]
  return {
    fit: nameOf(fit),
    modification: listed,
    pairs: pairs.filter(({ seabed }) => mayRead(actor, { what: 'pulls', seabed }).allowed),
    pairsInAll: inAll,
    cohesive: cohesiveOf(listed),
    worth: modificationWorth(estimates, reference, fit),
    reference,
    sizes: sizes.map(({ design, massKg, price }) => ({ design, massKg, price })),
    hidden,
  }
}

/** What a modification is worth for a plan. One statement. @throws FieldError naming what a plan refuses; ApiError 404 where there is none; 503 while there is no fit */
export async function modificationWorths(actor: Actor, request: ModificationWorthRequest): Promise<ModificationWorthAnswer> {
  const { fit } = await standingEvidence()
  if (!await findModification(database(), request.modification)) throw notFound()
  const { estimates } = readableOf(actor, fit, request.modification)
  return { fit: nameOf(fit), modification: request.modification, worth: modificationWorth(estimates, request.plan, fit) }
}
