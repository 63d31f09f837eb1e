import { and, asc, eq, inArray, sql } from 'drizzle-orm'
import type { DescribedRows } from '../../../shared/types/release'
import type { Family, NumberedSeabed, SoilKind } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, families, modifications, pulls, rigs, seabeds, sizes, trials } from '../schema'

type Source = Database | Transaction

const sizesOf = async (db: Source, ids: number[]): Promise<DescribedRows['sizes']> =>
  (await db.select({ design: designs.slug, size: sizes }).from(sizes).innerJoin(designs, eq(designs.id, sizes.designId)).where(inArray(sizes.id, ids)).orderBy(asc(sizes.id)))
    .map(({ design, size: { massKg, shankLengthMm, flukeWidthMm, overallHeightMm, shackleHoleMm, material, shankStrengthN, finish, stowsFlat } }) =>
      ({ design, massKg, shankLengthMm, flukeWidthMm, overallHeightMm, shackleHoleMm, material, shankStrengthN, finish, stowsFlat }))

async function trialsOf(db: Source, ids: number[]): Promise<DescribedRows['trials']> {
  const rows = await db.select({ trial: trials, rig: rigs.slug }).from(trials).innerJoin(rigs, eq(rigs.id, trials.rigId)).where(inArray(trials.id, ids)).orderBy(asc(trials.id))
  return rows.map(({ rig, trial: { id: _id, rigId: _rigId, rode, publishedAt, ...trial } }) => ({
    ...trial, rig,
    chainLengthM: rode.chainLengthM, chainDiameterMm: rode.chainDiameterMm, ropeLengthM: rode.ropeLengthM ?? null, ropeDiameterMm: rode.ropeDiameterMm ?? null, bowHeightM: rode.bowHeightM,
    publishedAt: publishedAt === null ? '' : new Date(publishedAt).toISOString(),
  }))
}

async function rigsOf(db: Source, trialIds: number[]): Promise<DescribedRows['rigs']> {
  const rows = await db.selectDistinctOn([rigs.id], { rig: rigs }).from(rigs).innerJoin(trials, eq(trials.rigId, rigs.id)).where(inArray(trials.id, trialIds)).orderBy(asc(rigs.id))
  return rows.map(({ rig: { id: _id, ...rig } }) => rig)
}

const designsOf = async (db: Source, ids: number[]): Promise<DescribedRows['designs']> =>
  (await db.select({ design: designs, familyName: families.name }).from(designs).innerJoin(families, eq(families.slug, designs.family)).where(inArray(designs.id, ids)).orderBy(asc(designs.id)))
    .map(({ familyName, design: { id: _id, family, ...design } }) => ({ ...design, family: family as Family, familyName }))

/** What these pulls name, as it stands now. */
export async function describe(db: Source, pullIds: readonly number[]): Promise<DescribedRows> {
  const among = and(sql`${pulls.id} = any(${sql.param(pullIds)}::integer[])`)
  const named = await db.selectDistinct({ trial: pulls.trialId, design: pulls.designId, size: pulls.sizeId, modification: pulls.modificationId, seabed: pulls.seabed }).from(pulls).where(among)
  const ids = <Key extends 'trial' | 'design' | 'size'>(key: Key) => [...new Set(named.map(row => row[key]))]
  const modificationIds = [...new Set(named.flatMap(({ modification }) => modification ?? []))]
  const seabedRows = await db.select().from(seabeds).where(inArray(seabeds.slug, [...new Set(named.map(({ seabed }) => seabed))])).orderBy(asc(seabeds.slug))
  const modificationRows = modificationIds.length ? await db.select().from(modifications).where(inArray(modifications.id, modificationIds)).orderBy(asc(modifications.id)) : []
  return {
    seabeds: seabedRows.map(({ slug, name, soil }) => ({ slug: slug as NumberedSeabed, name, soil: soil as SoilKind })),
    designs: await designsOf(db, ids('design')),
    sizes: await sizesOf(db, ids('size')),
    modifications: modificationRows.map(({ slug, name, description, addedMassKg }) => ({ slug, name, description, addedMassKg })),
    rigs: await rigsOf(db, ids('trial')),
    trials: await trialsOf(db, ids('trial')),
  }
}
