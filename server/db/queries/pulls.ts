import { and, asc, count, countDistinct, eq, isNotNull, isNull, max, ne } from 'drizzle-orm'
import type { PullRecord } from '../../../shared/types/holding'
import type { Family, NumberedSeabed, PullAfter, PullEnd, SettingOutcome, VeerOutcome } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, modifications, pulls, rigs, sizes, trials } from '../schema'

const published = and(isNotNull(trials.publishedAt), isNull(pulls.supersededById))

/** The published pulls that stand, as the fit takes them. A fluke setting is part of the pull, not a modification. */
export async function publishedPulls(db: Database | Transaction): Promise<PullRecord[]> {
  const rows = await db.select({
    trial: trials.slug, rig: rigs.slug, calibrationSd: rigs.calibrationSd,
    design: designs.slug, family: designs.family, massKg: sizes.massKg, modification: modifications.slug,
    seabed: pulls.seabed, setting: pulls.setting, heldN: pulls.heldN, movedN: pulls.movedN,
    shankAngleDeg: pulls.shankAngleDeg, end: pulls.end, after: pulls.after, veer: pulls.veer, fresh: pulls.fresh, pair: pulls.pair,
  }).from(pulls)
    .innerJoin(trials, eq(trials.id, pulls.trialId))
    .innerJoin(rigs, eq(rigs.id, trials.rigId))
    .innerJoin(designs, eq(designs.id, pulls.designId))
    .innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .leftJoin(modifications, eq(modifications.id, pulls.modificationId))
    .where(published)
    .orderBy(asc(pulls.id))
  return rows.map(row => ({
    trial: row.trial,
    rig: row.rig,
    ...row.calibrationSd === null ? {} : { calibrationSd: row.calibrationSd },
    design: row.design,
    family: row.family as Family,
    massKg: row.massKg,
    seabed: row.seabed as NumberedSeabed,
    ...row.modification === null ? {} : { modification: row.modification },
    set: row.setting === 'set' || row.setting === 'setAfterDragging',
    setting: row.setting as SettingOutcome,
    heldN: row.heldN,
    movedN: row.movedN,
    shankAngleDeg: row.shankAngleDeg,
    ...row.fresh ? {} : { fresh: false },
    ...row.end === null ? {} : { end: row.end as PullEnd },
    ...row.after === null ? {} : { after: row.after as PullAfter },
    ...row.veer === null ? {} : { veer: row.veer as VeerOutcome },
    ...row.pair === null ? {} : { pair: row.pair },
  }))
}

/**
 * A mark of the published pulls that stand: another one as soon as a pull is published, corrected or withdrawn. Cheap to compare
 * before and after work that takes long.
 */
export async function publishedMark(db: Database | Transaction): Promise<string> {
  const [row] = await db.select({ pulls: count(), newest: max(pulls.id), trials: countDistinct(pulls.trialId) }).from(pulls)
    .innerJoin(trials, eq(trials.id, pulls.trialId))
    .where(published)
  return `${row?.pulls ?? 0}/${row?.newest ?? 0}/${row?.trials ?? 0}`
}

/** How many rigs made the published pulls: with one, a bias common to all of them cannot be seen. */
export async function countRigs(db: Database | Transaction): Promise<number> {
  const [row] = await db.select({ rigs: countDistinct(trials.rigId) }).from(trials)
    .innerJoin(pulls, eq(pulls.trialId, trials.id))
    .where(and(published, ne(pulls.setting, 'fouled')))
  return row?.rigs ?? 0
}
