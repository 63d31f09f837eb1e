import { and, asc, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm'
import type { Manner } from '../../../shared/types/reading'
import type { NumberedSeabed, SettingOutcome } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, modifications, pulls, sizes, trials } from '../schema'

type Db = Database | Transaction

/** A pull of a strip: what heldInterval() and a scaling need. */
export interface StripPull { design: string, seabed: NumberedSeabed, massKg: number, set: boolean, setting: SettingOutcome, fresh: boolean, heldN: number, movedN: number | null, shankAngleDeg: number }

/** Pulls that were published, stand, and are of the anchor as it is sold. */
const standing = and(isNotNull(trials.publishedAt), isNull(pulls.supersededById), isNull(pulls.modificationId))

const strip = {
  design: designs.slug, seabed: pulls.seabed, massKg: sizes.massKg, setting: pulls.setting, fresh: pulls.fresh,
  heldN: pulls.heldN, movedN: pulls.movedN, shankAngleDeg: pulls.shankAngleDeg,
}

const known = <Row extends { seabed: string, setting: string }>(row: Row) => ({
  ...row, seabed: row.seabed as NumberedSeabed, setting: row.setting as SettingOutcome, set: row.setting === 'set' || row.setting === 'setAfterDragging',
})

/** A design's newest pulls, at most so many a seabed. One statement, by the index on design and seabed. */
export async function pullsOfDesign(db: Db, designId: number, mostASeabed: number): Promise<StripPull[]> {
  const ranked = db.select({ ...strip, place: sql<number>`row_number() over (partition by ${pulls.seabed} order by ${pulls.id} desc)`.as('place') })
    .from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId)).innerJoin(designs, eq(designs.id, pulls.designId)).innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .where(and(eq(pulls.designId, designId), standing)).as('ranked')
  const rows = await db.select().from(ranked).where(sql`${ranked.place} <= ${mostASeabed}`).orderBy(asc(ranked.seabed), asc(ranked.place))
  return rows.map(({ place: _place, ...row }) => known(row))
}

/** The newest pulls of each of some designs on one seabed, at most so many a design. One statement, design by design through the index. */
export async function pullsOnSeabed(db: Db, slugs: readonly string[], seabed: NumberedSeabed, mostADesign: number): Promise<StripPull[]> {
  if (slugs.length === 0) return []
  const newest = db.select({ seabed: pulls.seabed, massKg: sizes.massKg, setting: pulls.setting, fresh: pulls.fresh, heldN: pulls.heldN, movedN: pulls.movedN, shankAngleDeg: pulls.shankAngleDeg, id: pulls.id })
    .from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId)).innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .where(and(eq(pulls.designId, designs.id), eq(pulls.seabed, seabed), standing)).orderBy(desc(pulls.id)).limit(mostADesign).as('newest')
  const rows = await db.select({ design: designs.slug, ...{ seabed: newest.seabed, massKg: newest.massKg, setting: newest.setting, fresh: newest.fresh, heldN: newest.heldN, movedN: newest.movedN, shankAngleDeg: newest.shankAngleDeg } })
    .from(designs).innerJoinLateral(newest, sql`true`).where(sql`${designs.slug} = any(${sql.param([...slugs])})`).orderBy(asc(designs.slug), desc(newest.id))
  return rows.map(known)
}

const words = ['setting', 'end', 'after', 'veer', 'attitude', 'fouling', 'condition'] as const

/** How a design's pulls went, counted word by word. One statement. */
export async function mannerOf(db: Db, designId: number): Promise<Manner> {
  const columns = { setting: pulls.setting, end: pulls.end, after: pulls.after, veer: pulls.veer, attitude: pulls.attitude, fouling: pulls.fouling, condition: pulls.condition }
  const rows = await db.select({ ...columns, count: sql<number>`count(*)::int` }).from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId))
    .where(and(eq(pulls.designId, designId), standing)).groupBy(...Object.values(columns))
  const counts = (word: (typeof words)[number]) => {
    const found = new Map<string, number>()
    for (const row of rows) {
      const said = row[word]
      if (said !== null) found.set(said, (found.get(said) ?? 0) + row.count)
    }
    return [...found].map(([text, count]) => ({ word: text, count })).sort((a, b) => b.count - a.count || (a.word < b.word ? -1 : 1))
  }
  return { pulls: rows.reduce((sum, { count }) => sum + count, 0), ...Object.fromEntries(words.map(word => [word, counts(word)])) } as unknown as Manner
}

/** The newest trials with pulls of a design, at most so many. One statement. */
export async function trialsOfDesign(db: Db, designId: number, most: number): Promise<{ slug: string, day: string, place: string, pulls: number }[]> {
  return db.select({ slug: trials.slug, day: trials.day, place: trials.place, pulls: sql<number>`count(*)::int` })
    .from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId)).where(and(eq(pulls.designId, designId), isNotNull(trials.publishedAt), isNull(pulls.supersededById)))
    .groupBy(trials.id).orderBy(desc(trials.day), desc(trials.id)).limit(most)
}

/** Names of modifications by slug. One statement. */
export async function modificationNames(db: Db): Promise<Map<string, string>> {
  return new Map((await db.select({ slug: modifications.slug, name: modifications.name }).from(modifications)).map(({ slug, name }) => [slug, name]))
}
