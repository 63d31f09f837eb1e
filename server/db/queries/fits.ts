import { and, asc, desc, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm'
import type { DesignEstimate, HoldingFit, ModificationEstimate, SeabedFit, StoredFit } from '../../../shared/types/holding'
import type { Family, NumberedSeabed } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { covariances, designs, estimates, fits, modifications } from '../schema'

/** The channel that tells every instance of a new fit. */
export const fitChannel = 'kedgewise_fit'

/** The number of the fit that readers are answered from: the one that stands since last; null while there is none. */
export async function newestFitId(db: Database | Transaction): Promise<number | null> {
  const [row] = await db.select({ id: fits.id }).from(fits).where(isNotNull(fits.standsFrom))
    .orderBy(desc(fits.standsFrom), desc(fits.id)).limit(1)
  return row?.id ?? null
}

/** Any constant of our own, other than the migrations'. */
const fitsLock = 5_172_022

/** Lets one transaction at a time decide which fit stands; let go of when it ends. */
export async function lockFits(tx: Transaction): Promise<void> {
  await tx.execute(sql`select pg_advisory_xact_lock(${fitsLock})`)
}

/** The model of the fit that readers are answered from, or null. */
export async function standingModel(db: Database | Transaction): Promise<string | null> {
  const id = await newestFitId(db)
  const [row] = id === null ? [] : await db.select({ modelVersion: fits.modelVersion }).from(fits).where(eq(fits.id, id))
  return row?.modelVersion ?? null
}

/** Lets readers be answered from a stored fit from now on, and tells every instance when the transaction commits. */
export async function letStand(tx: Transaction, fitId: number): Promise<void> {
  await tx.update(fits).set({ standsFrom: sql`clock_timestamp()` }).where(eq(fits.id, fitId))
  await tx.execute(sql`select pg_notify(${fitChannel}, ${String(fitId)})`)
}

/** The number of the fit made from this very data under this model, or null. */
export async function fitIdFor(db: Database | Transaction, modelVersion: string, dataHash: string): Promise<number | null> {
  const [row] = await db.select({ id: fits.id }).from(fits)
    .where(and(eq(fits.modelVersion, modelVersion), eq(fits.dataHash, dataHash)))
  return row?.id ?? null
}

function estimateRow(fitId: number, seabed: string, designId: number, estimate: DesignEstimate) {
  return {
    fitId, seabed, designId,
    lnMean: estimate.lnMean15Kg,
    lnSd: estimate.lnSd,
    pulls: estimate.pulls,
    days: estimate.days,
    atLimit: estimate.atLimit,
    leastMassKg: estimate.massRangeKg?.[0] ?? null,
    greatestMassKg: estimate.massRangeKg?.[1] ?? null,
    mostShown15KgN: estimate.mostShown15KgN,
    setShare: estimate.setShare,
    resetShare: estimate.resetShare,
    veerShare: estimate.veerShare,
  }
}

/** Stores a fit whole, in the transaction given; readers are answered from it once letStand() says so. */
export async function insertFit(tx: Transaction, fit: HoldingFit): Promise<number> {
  const designIds = new Map((await tx.select({ id: designs.id, slug: designs.slug }).from(designs)).map(row => [row.slug, row.id]))
  const modificationIds = new Map((await tx.select({ id: modifications.id, slug: modifications.slug }).from(modifications)).map(row => [row.slug, row.id]))
  const idOf = (ids: Map<string, number>, slug: string) => {
    const id = ids.get(slug)
    if (id === undefined) throw new Error(`the fit names ${slug}, which is not in the database`)
    return id
  }
  const [row] = await tx.insert(fits)
    .values({ modelVersion: fit.modelVersion, dataHash: fit.dataHash, sigma: fit.sigma, sds: fit.sds })
    .returning({ id: fits.id })
  if (!row) throw new Error('the fit was not stored')
  const fitId = row.id
  const rows = fit.seabeds.flatMap(({ seabed, designs: list }) =>
    list.map(estimate => estimateRow(fitId, seabed, idOf(designIds, estimate.design), estimate)))
  if (rows.length) await tx.insert(estimates).values(rows)
  if (fit.modifications.length) {
    await tx.insert(estimates).values(fit.modifications.map(ratio => ({
      fitId,
      designId: idOf(designIds, ratio.design),
      modificationId: idOf(modificationIds, ratio.modification),
      seabed: ratio.seabed, lnMean: ratio.lnRatio, lnSd: ratio.lnSd, pulls: ratio.pulls, pairs: ratio.pairs, verdict: ratio.verdict,
    })))
  }
  if (fit.seabeds.length) {
    await tx.insert(covariances).values(fit.seabeds.map(part => ({
      fitId, seabed: part.seabed, exponent: part.exponent, betaMean: part.betaMean,
      designIds: part.designs.map(({ design }) => idOf(designIds, design)),
      values: part.covariance,
    })))
  }
  return fitId
}

function designEstimate(row: typeof estimates.$inferSelect, design: { slug: string, family: string }): DesignEstimate {
  return {
    design: design.slug,
    family: design.family as Family,
    lnMean15Kg: row.lnMean,
    lnSd: row.lnSd,
    pulls: row.pulls,
    days: row.days ?? 0,
    atLimit: row.atLimit ?? 0,
    massRangeKg: row.leastMassKg === null || row.greatestMassKg === null ? null : [row.leastMassKg, row.greatestMassKg],
    mostShown15KgN: row.mostShown15KgN,
    setShare: row.setShare,
    resetShare: row.resetShare,
    veerShare: row.veerShare,
  }
}

async function readModifications(db: Database | Transaction, fitId: number): Promise<ModificationEstimate[]> {
  const rows = await db.select({ row: estimates, design: designs.slug, modification: modifications.slug }).from(estimates)
    .innerJoin(designs, eq(designs.id, estimates.designId))
    .innerJoin(modifications, eq(modifications.id, estimates.modificationId))
    .where(eq(estimates.fitId, fitId))
    .orderBy(asc(modifications.slug), asc(designs.slug), asc(estimates.seabed))
  return rows.map(({ row, design, modification }) => ({
    design, modification,
    seabed: row.seabed as NumberedSeabed,
    lnRatio: row.lnMean,
    lnSd: row.lnSd,
    pulls: row.pulls,
    pairs: row.pairs ?? 0,
    verdict: row.verdict as ModificationEstimate['verdict'],
  }))
}

/** One stored fit, whole, as readers keep it in memory; null when there is none of that number. */
export async function readFit(db: Database | Transaction, fitId: number): Promise<StoredFit | null> {
  const [fit] = await db.select().from(fits).where(eq(fits.id, fitId))
  if (!fit) return null
  const joints = await db.select().from(covariances).where(eq(covariances.fitId, fitId)).orderBy(asc(covariances.seabed))
  const rows = await db.select({ row: estimates, slug: designs.slug, family: designs.family }).from(estimates)
    .innerJoin(designs, eq(designs.id, estimates.designId))
    .where(and(eq(estimates.fitId, fitId), isNull(estimates.modificationId), inArray(estimates.seabed, joints.map(joint => joint.seabed))))
  const found = new Map(rows.map(({ row, ...design }) => [`${row.seabed}/${row.designId}`, designEstimate(row, design)]))
  const parts = joints.map((joint): SeabedFit => ({
    seabed: joint.seabed as NumberedSeabed,
    exponent: joint.exponent,
    betaMean: joint.betaMean,
    designs: joint.designIds.map((id) => {
      const estimate = found.get(`${joint.seabed}/${id}`)
      if (!estimate) throw new Error(`fit ${fitId} lacks an estimate of design ${id} on ${joint.seabed}`)
      return estimate
    }),
    covariance: joint.values,
  }))
  return {
    id: fit.id,
    at: new Date(fit.createdAt).toISOString(),
    modelVersion: fit.modelVersion,
    dataHash: fit.dataHash,
    sigma: fit.sigma,
    sds: fit.sds,
    seabeds: parts,
    modifications: await readModifications(db, fitId),
  }
}
