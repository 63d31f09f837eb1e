import type { ReferenceBoat, ReferenceBoatsAnswer, ServingOnSeabed } from '#shared/types/method'
import type { RankedRow, RankingRequest } from '#shared/types/ranking'
import { type NumberedSeabed, numberedSeabeds } from '#shared/types/words'
import { rankDesigns } from '#shared/ranking/rank'
import { KN_MS } from '#shared/units/constants'
import type { Evidence } from './evidence'
import { standingEvidence } from './standing'

const sizes = [[8, 2.7], [11, 3.5], [15, 4.5]] as const

/** 30 kn entered as a gust, no current, no swell, and so much chain that the pull lies flat. */
export function referencePlan(lengthM: number, beamM: number, seabed: NumberedSeabed): RankingRequest {
  return {
    boat: { type: 'sailMonohull', lengthM, beamM },
    wind: { speedMs: 30 * KN_MS, kind: 'gust' },
    rode: { chain: { lengthM: 100, diameterMm: 10, grade: 'G40' } },
    depthM: 5,
    seabeds: [{ seabed, share: 1 }],
    target: 0.9,
  }
}

const serving = (rows: RankedRow[], by: 'survey' | 'table') => {
  const masses = rows.map(row => row.smallestServing[by]).filter(mass => mass !== null)
  return { massKg: masses.length ? Math.min(...masses) : null, designs: masses.length }
}

/** Lets waiting requests be answered between two rankings. */
const breathe = () => new Promise<void>(resolve => setImmediate(resolve))

async function referenceBoat(evidence: Evidence, lengthM: number, beamM: number): Promise<ReferenceBoat> {
  const pulled = numberedSeabeds.filter(seabed => evidence.fit.seabeds.some(part => part.seabed === seabed))
  const answers = []
  for (const seabed of pulled) {
    answers.push({ seabed, answer: rankDesigns(referencePlan(lengthM, beamM, seabed), evidence.catalogue, evidence.fit) })
    await breathe()
  }
  const [first] = answers
  return {
    lengthM,
    beamM,
    surveyN: first?.answer.load.survey.totalN ?? 0,
    tableN: first?.answer.load.table?.loadN ?? null,
    ruleTableKg: first?.answer.ruleTables[0]?.anchorKg ?? null,
    seabeds: answers.map(({ seabed, answer: { rows } }): ServingOnSeabed =>
      ({ seabed, ranked: rows.length, survey: serving(rows, 'survey'), table: serving(rows, 'table') })),
  }
}

async function workOut(evidence: Evidence): Promise<ReferenceBoatsAnswer> {
  const { id, modelVersion, at } = evidence.fit
  const boats = []
  for (const [lengthM, beamM] of sizes) boats.push(await referenceBoat(evidence, lengthM, beamM))
  return { fit: { id, modelVersion, at }, boats }
}

let held: { evidence: Evidence, answer: Promise<ReferenceBoatsAnswer> } | null = null

/** Three reference boats against the newest evidence; worked out once for it. @throws ApiError 503 while there is no fit */
export async function referenceBoats(): Promise<ReferenceBoatsAnswer> {
  const evidence = await standingEvidence()
  if (held?.evidence.fit !== evidence.fit) held = { evidence, answer: workOut(evidence) }
  return held.answer
}
