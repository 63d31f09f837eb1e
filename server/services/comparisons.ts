import { mayRead, type Actor } from '#shared/access/mayRead'
import { compareAnchors } from '#shared/ranking/compare'
import { summaryOf, verdictsOf } from '#shared/ranking/compareWords'
import { isNumbered } from '#shared/seabed/seabeds'
import type { ComparedSeabed, ComparisonAnswer, ComparisonRequest } from '#shared/types/comparison'
import { endsOf, sizesOf, type EndsOnSeabed } from '../db/queries/comparePulls'
import { database } from './application'
import { standingEvidence } from './standing'

type Sizes = Awaited<ReturnType<typeof sizesOf>>

/** What of a whole comparison an actor may read, as `may` decides it; `hidden` counts the seabeds left out. */
export function readableComparison(actor: Actor, whole: ComparisonAnswer, may: typeof mayRead = mayRead): ComparisonAnswer {
  const seabeds = whole.seabeds.filter(({ seabed }) => may(actor, { what: 'comparison', seabed }).allowed)
  const hidden = whole.seabeds.length - seabeds.length
  if (hidden === 0) return whole
  const names = whole.anchors.map(({ name }) => name)
  return {
    ...whole,
    seabeds,
    anchors: whole.anchors.map(anchor => ({ ...anchor, worst: null, weightedChance: null })),
    summary: names.flatMap((a, first) => names.slice(first + 1).map((b, offset) => summaryOf([a, b], verdictsOf(seabeds, first, first + 1 + offset)))),
    hidden,
  }
}

/** The comparison with what stands in the database: sizes as a chandlery states them, and how pulls ended. */
function withRecords(answer: ComparisonAnswer, sizes: Sizes, ends: readonly EndsOnSeabed[]): ComparisonAnswer {
  const sizeOf = (wanted: string, massKg: number) => {
    const found = sizes.find(size => size.design === wanted && size.massKg === massKg)
    if (!found) return null
    const { design: _design, ...size } = found
    return size
  }
  const endsOn = (wanted: string, seabed: ComparedSeabed['seabed']) => {
    const found = ends.find(entry => entry.design === wanted && entry.seabed === seabed)
    if (!found) return null
    const { design: _design, seabed: _seabed, ...counts } = found
    return counts
  }
  return {
    ...answer,
    anchors: answer.anchors.map(anchor => ({ ...anchor, size: sizeOf(anchor.design, anchor.massKg) })),
    seabeds: answer.seabeds.map(entry => ({
      ...entry,
      holdings: entry.holdings.map((holding, i) => holding && { ...holding, ends: endsOn(answer.anchors[i]?.design ?? '', entry.seabed) }),
    })),
  }
}

/** Compares anchors. Two statements. @throws FieldError naming what the calculation refuses; ApiError 503 while there is no fit */
export async function comparisons(actor: Actor, request: ComparisonRequest): Promise<ComparisonAnswer> {
  const { fit, catalogue, rigs } = await standingEvidence()
  const answer = readableComparison(actor, compareAnchors(request, catalogue, fit, rigs))
  const slugs = [...new Set(answer.anchors.map(({ design }) => design))]
  const [sizes, ends] = await Promise.all([
    sizesOf(database(), slugs),
    endsOf(database(), slugs, answer.seabeds.map(({ seabed }) => seabed).filter(isNumbered)),
  ])
  return withRecords(answer, sizes, ends)
}
