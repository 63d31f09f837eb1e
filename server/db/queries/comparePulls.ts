import { and, asc, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm'
import type { SizeListing } from '../../../shared/types/catalogue'
import type { EndCounts } from '../../../shared/types/comparison'
import { pullEnds, type NumberedSeabed, type PullEnd } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, pulls, sizes, trials } from '../schema'
import { listedSize } from './catalogue'

type Db = Database | Transaction

/** Every size of some designs, lightest first. One statement. */
export async function sizesOf(db: Db, slugs: readonly string[]): Promise<(SizeListing & { design: string })[]> {
  if (slugs.length === 0) return []
  const rows = await db.select({ design: designs.slug, size: sizes }).from(sizes).innerJoin(designs, eq(designs.id, sizes.designId))
    .where(inArray(designs.slug, [...slugs])).orderBy(asc(designs.slug), asc(sizes.massKg))
  return rows.map(({ design, size }) => ({ design, ...listedSize(size) }))
}

export interface EndsOnSeabed extends EndCounts { design: string, seabed: NumberedSeabed }

const noEnds = (): EndCounts => ({ ...Object.fromEntries(pullEnds.map(end => [end, 0])) as Record<PullEnd, number>, neverSet: 0, fouled: 0, pulls: 0 })

/**
 * How the unmodified pulls of some designs ended on some seabeds: published, standing, of an anchor freshly laid.
 * One statement, design by design through the index on design and seabed.
 */
export async function endsOf(db: Db, slugs: readonly string[], seabeds: readonly NumberedSeabed[]): Promise<EndsOnSeabed[]> {
  if (slugs.length === 0 || seabeds.length === 0) return []
  const counted = db.select({ seabed: pulls.seabed, setting: pulls.setting, end: pulls.end, count: sql<number>`count(*)::int`.as('count') })
    .from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId))
    .where(and(eq(pulls.designId, designs.id), inArray(pulls.seabed, [...seabeds]), eq(pulls.fresh, true),
      isNotNull(trials.publishedAt), isNull(pulls.supersededById), isNull(pulls.modificationId)))
    .groupBy(pulls.seabed, pulls.setting, pulls.end).as('counted')
  const rows = await db.select({ design: designs.slug, seabed: counted.seabed, setting: counted.setting, end: counted.end, count: counted.count })
    .from(designs).innerJoinLateral(counted, sql`true`).where(inArray(designs.slug, [...slugs]))
  const found = new Map<string, EndsOnSeabed>()
  for (const { design, seabed, setting, end, count } of rows) {
    const key = `${design}/${seabed}`
    const ends = found.get(key) ?? { design, seabed: seabed as NumberedSeabed, ...noEnds() }
    if (setting === 'neverSet' || setting === 'fouled') ends[setting] += count
    else if (end !== null) ends[end as PullEnd] += count
    ends.pulls += count
    found.set(key, ends)
  }
  return [...found.values()]
}
