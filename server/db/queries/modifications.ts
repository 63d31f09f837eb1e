import { and, asc, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm'
import type { ModificationListing, PairSide, PulledPair } from '../../../shared/types/modification'
import type { Fouling, NumberedSeabed, PullEnd, SettingOutcome } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, modifications, pulls, sizes, trials } from '../schema'

type Db = Database | Transaction

/** A modification as the catalogue has it, without what the pulls say. */
export type ModificationFacts = Pick<ModificationListing, 'slug' | 'name' | 'description' | 'addedMassKg' | 'price'>

function facts({ slug, name, description, addedMassKg, priceMinor, priceCurrency, priceOn }: typeof modifications.$inferSelect): ModificationFacts {
  const price = priceMinor === null || priceCurrency === null || priceOn === null ? null : { minor: priceMinor, currency: priceCurrency, on: priceOn }
  return { slug, name, description, addedMassKg, price }
}

/** Every modification by name. One statement. */
export async function listModifications(db: Db): Promise<ModificationFacts[]> {
  return (await db.select().from(modifications).orderBy(asc(modifications.name), asc(modifications.id))).map(facts)
}

/** One modification, null where there is none of that name. One statement. */
export async function findModification(db: Db, slug: string): Promise<ModificationFacts | null> {
  const [row] = await db.select().from(modifications).where(eq(modifications.slug, slug))
  return row ? facts(row) : null
}

interface PairKey { trialId: number, trial: string, day: string, place: string, pair: string }

const standing = and(isNotNull(trials.publishedAt), isNull(pulls.supersededById), isNotNull(pulls.pair))

/** The newest back-to-back pairs of a modification, at most so many, and how many there are in all. One statement, by the index on the modification. */
async function pairKeys(db: Db, slug: string, most: number): Promise<{ keys: PairKey[], inAll: number }> {
  const own = db.selectDistinct({ trialId: trials.id, trial: trials.slug, day: trials.day, place: trials.place, pair: sql<string>`${pulls.pair}`.as('pair') }).from(pulls)
    .innerJoin(trials, eq(trials.id, pulls.trialId)).innerJoin(modifications, eq(modifications.id, pulls.modificationId))
    .where(and(eq(modifications.slug, slug), standing)).as('own')
  const rows = await db.select({ key: { trialId: own.trialId, trial: own.trial, day: own.day, place: own.place, pair: own.pair }, inAll: sql<number>`count(*) over ()::int` })
    .from(own).orderBy(desc(own.day), asc(own.trial), asc(own.pair)).limit(most)
  return { keys: rows.map(({ key }) => key), inAll: rows[0]?.inAll ?? 0 }
}

/** Every pull of some pairs, in the order they were made. One statement, by the index on trial and pair. */
async function pullsOfPairs(db: Db, keys: readonly PairKey[]) {
  if (keys.length === 0) return []
  const wanted = sql.join(keys.map(({ trialId, pair }) => sql`(${trialId}::int, ${pair}::text)`), sql`, `)
  return db.select({
    trialId: pulls.trialId, pair: pulls.pair, modified: sql<boolean>`${pulls.modificationId} is not null`, design: designs.slug, seabed: pulls.seabed,
    massKg: sizes.massKg, setting: pulls.setting, heldN: pulls.heldN, movedN: pulls.movedN, end: pulls.end, fouling: pulls.fouling,
  }).from(pulls).innerJoin(designs, eq(designs.id, pulls.designId)).innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .where(and(sql`(${pulls.trialId}, ${pulls.pair}) in (${wanted})`, isNotNull(pulls.pair), isNull(pulls.supersededById)))
    .orderBy(asc(pulls.trialId), asc(pulls.ordinal))
}

/** The newest back-to-back pairs behind a modification, at most so many, newest day first. Two statements. */
export async function pairsOf(db: Db, slug: string, most: number): Promise<{ pairs: PulledPair[], inAll: number }> {
  const { keys, inAll } = await pairKeys(db, slug, most)
  const rows = await pullsOfPairs(db, keys)
  const pairs = keys.flatMap(({ trialId, pair, trial, day, place }): PulledPair[] => {
    const own = rows.filter(row => row.trialId === trialId && row.pair === pair)
    const [first] = own
    const sides = (modified: boolean): PairSide[] => own.filter(row => row.modified === modified).map(({ massKg, setting, heldN, movedN, end, fouling }) =>
      ({ massKg, setting: setting as SettingOutcome, heldN, movedN, end: end as PullEnd | null, fouling: fouling as Fouling }))
    return first ? [{ trial, day, place, design: first.design, seabed: first.seabed as NumberedSeabed, modified: sides(true), unmodified: sides(false) }] : []
  })
  return { pairs, inAll }
}
