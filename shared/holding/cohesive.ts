import type { ModificationRatio } from '#shared/types/modification'
import type { NumberedSeabed } from '#shared/types/words'
import { seabedFacts } from '#shared/seabed/seabeds'

/** Seabeds of one kind throughout (ours): mixed, layered and overgrown ones say nothing of mud against sand. */
export const cohesiveSeabeds: readonly NumberedSeabed[] = ['soft-mud', 'silt', 'firm-mud', 'stiff-clay']
export const cleanSeabeds: readonly NumberedSeabed[] = ['loose-sand', 'hard-sand', 'gravel']

type Judged = Pick<ModificationRatio, 'seabed' | 'ratio' | 'verdict'>

const effects = { better: 'it holds more', worse: 'it holds less', noDifference: 'it makes no difference that matters' } as const

const names = (ratios: readonly Judged[]) => ratios.map(({ seabed }) => seabedFacts(seabed).name).join(', ')
const least = (ratios: readonly Judged[]) => Math.min(...ratios.map(({ ratio }) => ratio.low90))
const most = (ratios: readonly Judged[]) => Math.max(...ratios.map(({ ratio }) => ratio.high90))

/**
 * What a modification does on cohesive seabeds (mud, clay) against clean ones (sand, gravel), where back-to-back pairs on
 * both kinds say it: that every interval on the one lies clear of every interval on the other, or that all carry one and the
 * same verdict. Ours; anything less is left unsaid.
 *
 * @param ratios of one design with one modification, a seabed each; those without a verdict count for nothing
 * @returns a sentence, or null where the pulls do not say it
 */
export function cohesiveNote(ratios: readonly Judged[]): string | null {
  const judged = ratios.filter(({ verdict }) => verdict !== null)
  const mud = judged.filter(({ seabed }) => cohesiveSeabeds.includes(seabed))
  const sand = judged.filter(({ seabed }) => cleanSeabeds.includes(seabed))
  if (mud.length === 0 || sand.length === 0) return null
  const [onMud, onSand] = [`mud and clay (pulled on ${names(mud)})`, `sand and gravel (pulled on ${names(sand)})`]
  const clear = 'every interval on the one lies clear of every interval on the other'
  if (least(mud) > most(sand)) return `Against the unmodified anchor it holds more on ${onMud} than on ${onSand}: ${clear}.`
  if (least(sand) > most(mud)) return `Against the unmodified anchor it holds less on ${onMud} than on ${onSand}: ${clear}.`
  const [verdict] = new Set([...mud, ...sand].map(entry => entry.verdict))
  const agreed = [...mud, ...sand].every(entry => entry.verdict === verdict)
  if (!agreed || verdict === undefined || verdict === null || verdict === 'cannotTell') return null
  return `On ${onMud} as on ${onSand} ${effects[verdict]}: the pulls show no split between cohesive and clean seabeds.`
}
