import { alias } from 'drizzle-orm/pg-core'
import { and, asc, desc, eq, exists, inArray, isNotNull, isNull, sql } from 'drizzle-orm'
import type { ReadPull, TrialFacts, TrialListing, TrialReply } from '../../../shared/types/reading'
import type { NumberedSeabed } from '../../../shared/types/words'
import type { Database, Transaction } from '../client'
import { designs, modifications, pullQuestions, pulls, rigs, sizes, trialReplies, trials } from '../schema'
import { pageSize } from './designPages'

type Db = Database | Transaction

interface TrialsWanted { seabed?: NumberedSeabed, design?: string, page?: number }

/** What a trial's pulls were on and of, and how many. */
async function contentsOf(db: Db, ids: number[]): Promise<Map<number, Pick<TrialListing, 'seabeds' | 'designs' | 'pulls'>>> {
  const rows = ids.length
    ? await db.select({
        id: pulls.trialId, pulls: sql<number>`count(*)::int`, designs: sql<number>`count(distinct ${pulls.designId})::int`,
        seabeds: sql<NumberedSeabed[]>`array_agg(distinct ${pulls.seabed})`,
      }).from(pulls).where(and(inArray(pulls.trialId, ids), isNull(pulls.supersededById))).groupBy(pulls.trialId)
    : []
  return new Map(rows.map(({ id, ...contents }) => [id, contents]))
}

/** A page of fifty published trials, newest first, and how many there are in all: three statements. */
export async function pageOfTrials(db: Db, { seabed, design, page = 1 }: TrialsWanted): Promise<{ total: number, trials: TrialListing[] }> {
  const within = seabed || design
    ? exists(db.select({ one: sql`1` }).from(pulls).innerJoin(designs, eq(designs.id, pulls.designId)).where(and(
        eq(pulls.trialId, trials.id), isNull(pulls.supersededById), seabed ? eq(pulls.seabed, seabed) : undefined, design ? eq(designs.slug, design) : undefined)))
    : undefined
  const where = and(isNotNull(trials.publishedAt), within)
  const [counted] = await db.select({ total: sql<number>`count(*)::int` }).from(trials).where(where)
  const rows = await db.select({ id: trials.id, slug: trials.slug, day: trials.day, place: trials.place, tester: trials.tester, rig: rigs.name, invented: trials.invented })
    .from(trials).innerJoin(rigs, eq(rigs.id, trials.rigId)).where(where).orderBy(desc(trials.day), desc(trials.id)).limit(pageSize).offset((page - 1) * pageSize)
  const contents = await contentsOf(db, rows.map(({ id }) => id))
  return {
    total: counted?.total ?? 0,
    trials: rows.map(({ id, ...row }) => ({ ...row, ...contents.get(id) ?? { seabeds: [], designs: 0, pulls: 0 } })),
  }
}

/** A published trial with its rig, and its number; null where there is none of that name: one statement. */
export async function findTrial(db: Db, slug: string): Promise<{ id: number, trial: TrialFacts } | null> {
  const [row] = await db.select({ trial: trials, rig: rigs }).from(trials).innerJoin(rigs, eq(rigs.id, trials.rigId))
    .where(and(eq(trials.slug, slug), isNotNull(trials.publishedAt)))
  if (!row) return null
  const { slug: name, day, place, tester, latitudeDeg, longitudeDeg, depthM, windMs, windFrom, currentMs, waveHeightM, seaState, procedure, note, rode, invented } = row.trial
  const { name: rigName, vessel, method, limitN, stepsN, holdS, calibratedOn, calibrationMethod, calibrationSd } = row.rig
  return {
    id: row.trial.id,
    trial: {
      slug: name, day, place, tester, latitudeDeg, longitudeDeg, depthM, windMs, windFrom, currentMs, waveHeightM, seaState, procedure, note, rode, invented,
      rig: { name: rigName, vessel, method, limitN, stepsN, holdS, calibratedOn, calibrationMethod, calibrationSd },
    },
  }
}

/** Every pull of a trial in the order they were made, corrected ones with what stands in their place: one statement. */
export async function pullsOfTrial(db: Db, trialId: number): Promise<ReadPull[]> {
  const successor = alias(pulls, 'successor')
  const rows = await db.select({ pull: pulls, design: designs.slug, name: designs.name, massKg: sizes.massKg, modification: modifications.slug, modificationName: modifications.name, supersededBy: successor.ordinal })
    .from(pulls).innerJoin(designs, eq(designs.id, pulls.designId)).innerJoin(sizes, eq(sizes.id, pulls.sizeId))
    .leftJoin(modifications, eq(modifications.id, pulls.modificationId)).leftJoin(successor, eq(successor.id, pulls.supersededById))
    .where(eq(pulls.trialId, trialId)).orderBy(asc(pulls.ordinal))
  return rows.map(({ pull, modification, modificationName, ...row }) => {
    const { id, ordinal, anchorSetting, pair, seabed, setting, firstTry, fresh, heldN, movedN, shankAngleDeg, end, creepMMin, after, veerDeg, veer, attitude, fouling, condition, note } = pull
    return {
      ...row, id, ordinal, anchorSetting, pair, seabed, setting, firstTry, fresh, heldN, movedN, shankAngleDeg, end, creepMMin, after, veerDeg, veer, attitude, fouling, condition, note,
      modification: modification === null || modificationName === null ? null : { slug: modification, name: modificationName },
    } as ReadPull
  })
}

/** What whoever made a design said to a trial, oldest first: one statement. */
export async function repliesTo(db: Db, trialId: number): Promise<TrialReply[]> {
  const rows = await db.select({ author: trialReplies.author, reply: trialReplies.reply, publishedAt: trialReplies.publishedAt })
    .from(trialReplies).where(eq(trialReplies.trialId, trialId)).orderBy(asc(trialReplies.publishedAt), asc(trialReplies.id))
  return rows.map(row => ({ ...row, publishedAt: new Date(row.publishedAt).toISOString() }))
}

/** Keeps a question for the reviewers; null where there is no published pull of that number. */
export async function insertQuestion(db: Db, pullId: number, question: string, mailAddress: string): Promise<{ id: number, pullId: number, createdAt: string } | null> {
  const [published] = await db.select({ id: pulls.id }).from(pulls).innerJoin(trials, eq(trials.id, pulls.trialId)).where(and(eq(pulls.id, pullId), isNotNull(trials.publishedAt)))
  if (!published) return null
  const [row] = await db.insert(pullQuestions).values({ pullId, question, mailAddress }).returning({ id: pullQuestions.id, createdAt: pullQuestions.createdAt })
  return row ? { id: row.id, pullId, createdAt: new Date(row.createdAt).toISOString() } : null
}
