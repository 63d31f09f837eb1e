import { and, asc, desc, eq, exists, gt, inArray, isNull, not, or, sql, type SQL } from 'drizzle-orm'
import type { DesignListing } from '../../../shared/types/catalogue'
import type { DesignsQuery, ListedDesign, TestedSeabed } from '../../../shared/types/reading'
import type { Family, NumberedSeabed } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, estimates, families, sizes } from '../schema'
import { listedSize } from './catalogue'

export const pageSize = 50

type Db = Database | Transaction

/** A text as LIKE takes it literally, anywhere. */
const anywhere = (text: string) => `%${text.replace(/[\\%_]/g, sign => `\\${sign}`)}%`

/** Estimates of a design's unmodified pulls in a fit. */
const pulledIn = (fitId: number) => and(
  eq(estimates.designId, designs.id), eq(estimates.fitId, fitId), isNull(estimates.modificationId), gt(estimates.pulls, 0))

/** Which designs a query asks for. Without a fit nothing counts as tested. */
function conditions(db: Db, query: DesignsQuery, fitId: number): SQL | undefined {
  const { search, family, seabed, massKg, tested } = query
  const pulled = (where?: SQL) => exists(db.select({ one: sql`1` }).from(estimates).where(and(pulledIn(fitId), where)))
  const words = search?.trim() ? anywhere(search.trim()) : null
  return and(
    words ? or(sql`${designs.name} ilike ${words}`, sql`${families.name} ilike ${words}`, sql`${designs.description} ilike ${words}`) : undefined,
    family ? eq(designs.family, family) : undefined,
    seabed ? pulled(eq(estimates.seabed, seabed)) : undefined,
    massKg ? exists(db.select({ one: sql`1` }).from(sizes).where(and(eq(sizes.designId, designs.id), sql`${sizes.massKg} between ${massKg / 1.2} and ${massKg * 1.2}`))) : undefined,
    tested ? (tested === 'yes' ? pulled() : not(pulled())) : undefined,
  )
}

/** Pulls of a design in a fit, all seabeds together. */
const pullsOf = (fitId: number) => sql`(select coalesce(sum(${estimates.pulls}), 0) from ${estimates} where ${pulledIn(fitId)})`

function order(query: DesignsQuery, fitId: number): SQL[] {
  const last = [asc(designs.name), asc(designs.id)]
  if (query.sort === 'family') return [asc(families.name), ...last]
  if (query.sort === 'pulls') return [desc(pullsOf(fitId)), ...last]
  if (query.sort === 'holding' && query.seabed) {
    return [sql`(select ${estimates.lnMean} from ${estimates} where ${pulledIn(fitId)} and ${estimates.seabed} = ${query.seabed}) desc nulls last`, ...last]
  }
  return last
}

/** Sizes by design, lightest first. */
async function sizesOf(db: Db, ids: number[]): Promise<Map<number, DesignListing['sizes']>> {
  const rows = ids.length ? await db.select().from(sizes).where(inArray(sizes.designId, ids)).orderBy(asc(sizes.massKg)) : []
  const found = new Map<number, DesignListing['sizes']>()
  for (const row of rows) found.set(row.designId, [...found.get(row.designId) ?? [], listedSize(row)])
  return found
}

async function testedOf(db: Db, ids: number[], fitId: number): Promise<Map<number, TestedSeabed[]>> {
  const rows = ids.length
    ? await db.select({ id: estimates.designId, seabed: estimates.seabed, pulls: estimates.pulls }).from(estimates)
        .where(and(eq(estimates.fitId, fitId), inArray(estimates.designId, ids), isNull(estimates.modificationId), gt(estimates.pulls, 0)))
        .orderBy(asc(estimates.seabed))
    : []
  const found = new Map<number, TestedSeabed[]>()
  for (const { id, seabed, pulls } of rows) found.set(id, [...found.get(id) ?? [], { seabed: seabed as NumberedSeabed, pulls }])
  return found
}

const one = { id: designs.id, slug: designs.slug, name: designs.name, family: designs.family, familyName: families.name,
  description: designs.description, settings: designs.settings, invented: designs.invented }

/**
 * A page of fifty designs, and how many there are in all: four statements.
 *
 * @param fitId the fit that says what was tested; 0 for none
 */
export async function pageOfDesigns(db: Db, query: DesignsQuery, fitId: number): Promise<{ total: number, designs: ListedDesign[] }> {
  const where = conditions(db, query, fitId)
  const [counted] = await db.select({ total: sql<number>`count(*)::int` }).from(designs).innerJoin(families, eq(families.slug, designs.family)).where(where)
  const rows = await db.select(one).from(designs).innerJoin(families, eq(families.slug, designs.family)).where(where)
    .orderBy(...order(query, fitId)).limit(pageSize).offset(((query.page ?? 1) - 1) * pageSize)
  const ids = rows.map(({ id }) => id)
  const [bySize, byTest] = [await sizesOf(db, ids), await testedOf(db, ids, fitId)]
  return {
    total: counted?.total ?? 0,
    designs: rows.map(({ id, family, ...rest }) => {
      const tested = byTest.get(id) ?? []
      return { ...rest, family: family as Family, sizes: bySize.get(id) ?? [], pulls: tested.reduce((sum, { pulls }) => sum + pulls, 0), tested }
    }),
  }
}

/** One design with its sizes, and its number; null where there is none of that name: two statements. */
export async function findDesign(db: Db, slug: string): Promise<{ id: number, design: DesignListing } | null> {
  const [row] = await db.select(one).from(designs).innerJoin(families, eq(families.slug, designs.family)).where(eq(designs.slug, slug))
  if (!row) return null
  const { id, family, ...rest } = row
  return { id, design: { ...rest, family: family as Family, sizes: (await sizesOf(db, [id])).get(id) ?? [] } }
}

/** Slug and name of every design, by name. */
export async function designNames(db: Db): Promise<{ slug: string, name: string, family: Family }[]> {
  const rows = await db.select({ slug: designs.slug, name: designs.name, family: designs.family }).from(designs).orderBy(asc(designs.name), asc(designs.id))
  return rows.map(row => ({ ...row, family: row.family as Family }))
}
