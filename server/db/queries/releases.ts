import { and, asc, eq, inArray, isNull, lte, sql } from 'drizzle-orm'
import type { DescribedRows, ReleaseFile, ReleasePull } from '../../../shared/types/release'
import type { NumberedSeabed, PullAfter, PullEnd, SettingOutcome, VeerOutcome } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, estimates, fits, modifications, pulls, releases, sizes, trials } from '../schema'

type Source = Database | Transaction

const iso = (moment: string) => new Date(moment).toISOString()

/** The numbers of all pulls published by a moment, superseded ones too; a correction counts from when it was written down. */
export async function pullIdsAt(db: Source, cutAt: string): Promise<number[]> {
  const rows = await db.select({ id: pulls.id }).from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId))
    .where(and(lte(trials.publishedAt, cutAt), lte(pulls.recordedAt, cutAt)))
    .orderBy(asc(pulls.id))
  return rows.map(({ id }) => id)
}

/** These pulls with the names of what they name; superseded only where the pull that did it is one of them. */
export async function pullsOf(db: Source, ids: readonly number[]): Promise<ReleasePull[]> {
  const rows = await db.select({ pull: pulls, trial: trials.slug, design: designs.slug, massKg: sizes.massKg, modification: modifications.slug }).from(pulls)
    .innerJoin(trials, eq(trials.id, pulls.trialId))
    .innerJoin(designs, eq(designs.id, pulls.designId))
    .innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .leftJoin(modifications, eq(modifications.id, pulls.modificationId))
    .where(sql`${pulls.id} = any(${sql.param(ids)}::integer[])`)
  const nameOf = new Map(rows.map(({ pull, trial }) => [pull.id, `${trial}/${pull.ordinal}`]))
  return rows.map(({ pull: row, trial, design, massKg, modification }) => ({
    pull: `${trial}/${row.ordinal}`, trial, ordinal: row.ordinal, design, massKg, modification, anchorSetting: row.anchorSetting, pair: row.pair,
    seabed: row.seabed as NumberedSeabed, setting: row.setting as SettingOutcome, firstTry: row.firstTry, fresh: row.fresh,
    heldN: row.heldN, movedN: row.movedN, shankAngleDeg: row.shankAngleDeg, end: row.end as PullEnd | null, creepMMin: row.creepMMin,
    after: row.after as PullAfter | null, veerDeg: row.veerDeg, veer: row.veer as VeerOutcome | null, eastM: row.eastM, northM: row.northM,
    attitude: row.attitude, fouling: row.fouling, condition: row.condition, note: row.note,
    supersededBy: row.supersededById === null ? null : nameOf.get(row.supersededById) ?? null,
  }))
}

interface Stored { id: number, version: string, cutAt: string, madeAt: string, fitId: number, hash: string, notes: string, files: ReleaseFile[], described: DescribedRows }

/** A release with the numbers of its pulls; null where there is none of that version. */
export async function releaseOf(db: Source, version: string): Promise<Stored & { pullIds: number[] } | null> {
  const [row] = await db.select().from(releases).where(eq(releases.version, version))
  return row ? { ...row, cutAt: iso(row.cutAt), madeAt: iso(row.madeAt) } : null
}

export async function insertRelease(tx: Transaction, release: Omit<typeof releases.$inferInsert, 'id' | 'madeAt'>): Promise<void> {
  await tx.insert(releases).values(release)
}

/** Every release with how many pulls it has, and the fit behind it. */
export async function listReleases(db: Source) {
  const rows = await db.select({
    id: releases.id, version: releases.version, cutAt: releases.cutAt, madeAt: releases.madeAt, hash: releases.hash, notes: releases.notes,
    files: releases.files, described: releases.described, fitId: releases.fitId, modelVersion: fits.modelVersion, dataHash: fits.dataHash,
  }).from(releases).innerJoin(fits, eq(fits.id, releases.fitId))
  return rows.map(row => ({ ...row, cutAt: iso(row.cutAt), madeAt: iso(row.madeAt) }))
}

export type ListedRelease = Awaited<ReturnType<typeof listReleases>>[number]

export interface FittedHolding { fitId: number, design: string, name: string, seabed: NumberedSeabed, lnMean: number, lnSd: number, pulls: number }

/** What each of these fits says of each design on each seabed. */
export async function holdingsOf(db: Source, fitIds: readonly number[]): Promise<FittedHolding[]> {
  if (fitIds.length === 0) return []
  const rows = await db.select({
    fitId: estimates.fitId, design: designs.slug, name: designs.name, seabed: estimates.seabed, lnMean: estimates.lnMean, lnSd: estimates.lnSd, pulls: estimates.pulls,
  }).from(estimates).innerJoin(designs, eq(designs.id, estimates.designId))
    .where(and(inArray(estimates.fitId, [...fitIds]), isNull(estimates.modificationId)))
  return rows.map(row => ({ ...row, seabed: row.seabed as NumberedSeabed }))
}
