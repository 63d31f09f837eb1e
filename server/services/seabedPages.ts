import { mayRead, type Actor } from '#shared/access/mayRead'
import { tickAt } from '#shared/holding/tick'
import { orderOnSeabed, type SeabedOrder } from '#shared/ranking/onSeabed'
import { isNumbered, seabedFacts } from '#shared/seabed/seabeds'
import type { SeabedListing } from '#shared/types/catalogue'
import type { SeabedFit } from '#shared/types/holding'
import type { SeabedAnswer, SeabedRow } from '#shared/types/reading'
import { seabeds, type Seabed } from '#shared/types/words'
import { pullsOnSeabed } from '../db/queries/readPulls'
import { notFound } from '../utils/problem'
import { database } from './application'
import { nameOf } from './designPages'
import { currentEvidence } from './evidence'

/** Rows told, and ticks drawn a row, at most. */
const mostRows = 50
const mostTicks = 60
const usualMassKg = 15

const isSeabed = (slug: string): slug is Seabed => (seabeds as readonly string[]).includes(slug)

function listing(slug: Seabed): SeabedListing {
  const { name, soil, numbered, description, notation, cautions } = seabedFacts(slug)
  return { slug, name, soil, numbered, description, notation, cautions: [...cautions] }
}

async function withTicks(rows: SeabedRow[], fit: SeabedFit, massKg: number): Promise<SeabedRow[]> {
  const pulls = await pullsOnSeabed(database(), rows.map(({ design }) => design), fit.seabed, mostTicks)
  return rows.map(row => ({
    ...row,
    ticks: pulls.filter(({ design }) => design === row.design).map(pull => tickAt(fit, pull, massKg)).filter(tick => tick !== null),
  }))
}

/**
 * A seabed: what it is, and the designs on it in order of their median holding at one mass. One statement.
 *
 * @throws ApiError 404 where there is none of that name
 */
export async function seabedBySlug(actor: Actor, slug: string, massKg: number = usualMassKg): Promise<SeabedAnswer> {
  if (!isSeabed(slug) || !mayRead(actor, { what: 'seabed', seabed: slug }).allowed) throw notFound()
  const evidence = await currentEvidence()
  const fit = evidence?.fit.seabeds.find(part => part.seabed === slug)
  const figures = isNumbered(slug) && mayRead(actor, { what: 'estimate', seabed: slug }).allowed
  const order: SeabedOrder = figures && fit && evidence ? orderOnSeabed(fit, evidence.catalogue, massKg) : { ranked: [], thin: [], neverPulled: 0 }
  const shown = [...order.ranked.slice(0, mostRows), ...order.thin.slice(0, mostRows)]
  const rows = fit && mayRead(actor, { what: 'pulls', seabed: slug }).allowed ? await withTicks(shown, fit, massKg) : shown
  return {
    seabed: listing(slug),
    massKg,
    fit: nameOf(evidence?.fit),
    rows: rows.filter(({ rank }) => rank !== null),
    thin: rows.filter(({ rank }) => rank === null),
    ranked: order.ranked.length,
    thinCount: order.thin.length,
    neverPulled: order.neverPulled,
  }
}
