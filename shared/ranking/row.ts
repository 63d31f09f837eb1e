import type { CatalogueDesign, RankedRow, RankedSeabed } from '#shared/types/ranking'
import { isNumberedMix, type RankContext } from '#shared/ranking/context'
import { hasEvidence } from '#shared/ranking/evidence'
import { windRank } from '#shared/ranking/holdingWind'
import { explainRow } from '#shared/ranking/reason'
import { judgeSize, rankSeabed, type SizeResult } from '#shared/ranking/seabedRow'

/** A row with what ordering and judging it need. */
export interface Candidate {
  row: RankedRow
  /** enough pulls on enough days on every numbered seabed of the mix */
  ranked: boolean
  /** least chance once set over the numbered seabeds; null where one of them has no estimate */
  chanceWorst: number | null
}

/** The seabed with the lowest holding wind; of equals the one with the least chance, then by name. */
export function worstSeabed(seabeds: readonly RankedSeabed[]): RankedRow['worst'] {
  let worst: RankedSeabed | null = null
  for (const entry of seabeds) {
    if (entry.holdingWind !== null && (worst === null || isWorse(entry, worst))) worst = entry
  }
  return worst === null || worst.holdingWind === null ? null : { seabed: worst.seabed, holdingWind: worst.holdingWind }
}

function isWorse(a: RankedSeabed, b: RankedSeabed): boolean {
  if (a.holdingWind === null || b.holdingWind === null) return false
  const windA = windRank(a.holdingWind)
  const windB = windRank(b.holdingWind)
  if (windA !== windB) return windA < windB
  if (a.chance !== b.chance) return (a.chance ?? 0) < (b.chance ?? 0)
  return a.seabed < b.seabed
}

/** The smallest size that reaches the target by survey load, and the smallest that meets the table load; null for none. */
function smallestServing(sizes: readonly SizeResult[], target: number): RankedRow['smallestServing'] {
  const survey = sizes.find(({ chanceWorst }) => chanceWorst !== null && chanceWorst >= target)
  const table = sizes.find(({ meetsTable }) => meetsTable === true)
  return { survey: survey?.massKg ?? null, table: table?.massKg ?? null }
}

/**
 * One design at one mass against the plan, with its real sizes.
 *
 * @param massKg the row's mass, kg, more than 0
 */
export function buildRow(context: RankContext, design: CatalogueDesign, massKg: number): Candidate {
  const numbered = context.mix.filter(isNumberedMix)
  const seabeds = context.mix.map(entry => rankSeabed(context, entry, design.slug, massKg))
  const sizes = [...design.sizesKg].sort((a, b) => a - b).map(size => judgeSize(context, numbered, design.slug, size))
  const counted = seabeds.filter((_, i) => context.mix[i]?.fit !== null)
  const row: RankedRow = {
    rank: null,
    design: design.slug,
    name: design.name,
    family: design.family,
    tiedWithNext: false,
    reason: '',
    worst: worstSeabed(seabeds),
    weightedChance: Math.min(1, seabeds.reduce((sum, { share, chance }) => sum + share * (chance ?? 0), 0)),
    seabeds,
    smallestServing: smallestServing(sizes, context.target),
    sizes: sizes.map(({ massKg: size, chanceWorst }) => ({ massKg: size, chanceWorst })),
  }
  row.reason = explainRow(context, row, massKg)
  const { chanceWorst } = judgeSize(context, numbered, design.slug, massKg)
  return { row, ranked: counted.length > 0 && counted.every(hasEvidence), chanceWorst }
}
