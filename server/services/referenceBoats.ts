import type { ReferenceBoat, ReferenceBoatsAnswer, ServingOnSeabed } from '#shared/types/method'
import type { RankedRow, RankingRequest } from '#shared/types/ranking'
import { type NumberedSeabed, numberedSeabeds } from '#shared/types/words'
import { rankDesigns } from '#shared/ranking/rank'
import type { Evidence } from './evidence'
import { standingEvidence } from './standing'

const sizes = [[8, 2.7], [11, 3.5], [15, 4.5]] as const
const knotMs = 1852 / 3600

/** 30 kn entered as a gust, no current, no swell, and so much chain that the pull lies flat. */
export function referencePlan(lengthM: number, beamM: number, seabed: NumberedSeabed): RankingRequest {
  return {
    boat: { type: 'sailMonohull', lengthM, beamM },
    wind: { speedMs: 30 * knotMs, kind: 'gust' },
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

function referenceBoat(evidence: Evidence, lengthM: number, beamM: number): ReferenceBoat {
  const pulled = numberedSeabeds.filter(seabed => evidence.fit.seabeds.some(part => part.seabed === seabed))
  const answers = pulled.map(seabed => ({ seabed, answer: rankDesigns(referencePlan(lengthM, beamM, seabed), evidence.catalogue, evidence.fit) }))
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

let held: ReferenceBoatsAnswer | null = null

/** Three reference boats against the newest fit; worked out once a fit. @throws ApiError 503 while there is no fit */
export async function referenceBoats(): Promise<ReferenceBoatsAnswer> {
  const evidence = await standingEvidence()
  const { id, modelVersion, at } = evidence.fit
  if (held?.fit.id !== id) {
    held = { fit: { id, modelVersion, at }, boats: sizes.map(([lengthM, beamM]) => referenceBoat(evidence, lengthM, beamM)) }
  }
  return held
}
