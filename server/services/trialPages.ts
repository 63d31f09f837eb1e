import { mayRead, type Actor } from '#shared/access/mayRead'
import { predictLnHolding, designIndex } from '#shared/holding/predict'
import { whyDiffer } from '#shared/holding/whyDiffer'
import { z90 } from '#shared/stats/normal'
import { plainMeans } from '#shared/trial/plainMeans'
import type { PullRecord, StoredFit } from '#shared/types/holding'
import type { Family, NumberedSeabed } from '#shared/types/words'
import type { HoldingInterval, MeanBesideEstimate, PullQuestion, PullQuestionAnswer, ReadPull, TrialAnswer, TrialPullsAnswer, TrialsAnswer } from '#shared/types/reading'
import { pageSize } from '../db/queries/designPages'
import { findTrial, insertQuestion, pageOfTrials, pullsOfTrial, repliesTo } from '../db/queries/trialPages'
import { notFound } from '../utils/problem'
import { database } from './application'
import { nameOf } from './designPages'
import { currentEvidence } from './evidence'

/** A page of the published trials, newest first. */
export async function trialPage(actor: Actor, query: { seabed?: NumberedSeabed, design?: string, page?: number }): Promise<TrialsAnswer> {
  const { total, trials } = await pageOfTrials(database(), query)
  return { trials: trials.filter(({ slug }) => mayRead(actor, { what: 'trial', slug }).allowed), total, page: query.page ?? 1, pages: Math.ceil(total / pageSize) }
}

async function readableTrial(actor: Actor, slug: string) {
  const found = mayRead(actor, { what: 'trial', slug }).allowed ? await findTrial(database(), slug) : null
  if (!found) throw notFound()
  return found
}

/** A pull as the plain mean and the fit take it. */
const asRecord = (pull: ReadPull, trial: string): PullRecord => ({
  trial, design: pull.design, family: 'other' as Family, massKg: pull.massKg, seabed: pull.seabed,
  set: pull.setting === 'set' || pull.setting === 'setAfterDragging', setting: pull.setting,
  heldN: pull.heldN, movedN: pull.movedN, shankAngleDeg: pull.shankAngleDeg, fresh: pull.fresh,
})

function estimateOf(fit: StoredFit | undefined, { design, seabed, massKg }: ReadPull): { interval: HoldingInterval, pulls: number } | null {
  const part = fit?.seabeds.find(one => one.seabed === seabed)
  const estimate = part?.designs[designIndex(part, design)]
  if (!part || !estimate) return null
  const { mean, variance } = predictLnHolding(part, design, massKg)
  const half = z90 * Math.sqrt(variance)
  return { interval: { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) }, pulls: estimate.pulls }
}

/** The tester's plain mean beside the estimate, anchor by anchor; modified anchors have a page of their own. */
export function besideEstimates(pulls: readonly ReadPull[], fit: StoredFit | undefined, trial: string): MeanBesideEstimate[] {
  const groups = new Map<string, ReadPull[]>()
  for (const pull of pulls) {
    if (pull.modification !== null || pull.supersededBy !== null) continue
    const key = `${pull.seabed}/${pull.design}/${pull.massKg}`
    groups.set(key, [...groups.get(key) ?? [], pull])
  }
  return [...groups.values()].flatMap((group) => {
    const records = group.map(pull => asRecord(pull, trial))
    const [mean] = plainMeans(records)
    const [first] = group
    if (!first || !mean) return []
    const estimate = estimateOf(fit, first)
    const { design, name, massKg, seabed } = first
    return [{
      design, name, massKg, seabed, pulls: mean.pulls, meanN: mean.meanN, atLeast: mean.atLeast,
      estimateN: estimate?.interval ?? null, reason: whyDiffer(records, estimate?.interval.median ?? null, estimate?.pulls ?? 0),
    }]
  })
}

/**
 * A trial: its rig and day, its plain means beside the estimates, replies. Three statements.
 *
 * @throws ApiError 404 where there is none of that name
 */
export async function trialBySlug(actor: Actor, slug: string): Promise<TrialAnswer> {
  const { id, trial } = await readableTrial(actor, slug)
  const db = database()
  const [evidence, pulls, replies] = await Promise.all([currentEvidence(), pullsOfTrial(db, id), repliesTo(db, id)])
  const readable = pulls.filter(({ seabed }) => mayRead(actor, { what: 'pulls', seabed }).allowed && mayRead(actor, { what: 'estimate', seabed }).allowed)
  return { trial, fit: nameOf(evidence?.fit), comparisons: besideEstimates(readable, evidence?.fit, slug), replies }
}

/** The pulls of a trial. Two statements. @throws ApiError 404 where there is none of that name */
export async function trialPulls(actor: Actor, slug: string): Promise<TrialPullsAnswer> {
  const { id } = await readableTrial(actor, slug)
  const pulls = await pullsOfTrial(database(), id)
  return { pulls: pulls.filter(({ seabed }) => mayRead(actor, { what: 'pulls', seabed }).allowed) }
}

/** Keeps a question about a pull for the reviewers. @throws ApiError 404 where there is no published pull of that number */
export async function askAboutPull(pullId: number, { question, mailAddress }: PullQuestion): Promise<PullQuestionAnswer> {
  const kept = await insertQuestion(database(), pullId, question, mailAddress)
  if (!kept) throw notFound()
  return kept
}
