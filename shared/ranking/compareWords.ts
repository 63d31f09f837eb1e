import type { ComparedPair, ComparedSeabed, ComparisonVerdict } from '#shared/types/comparison'
import type { Seabed } from '#shared/types/words'
import { seabedFacts } from '#shared/seabed/seabeds'
import { inPercent } from '#shared/ranking/plainWords'

type Judged = Pick<ComparedPair, 'chance' | 'verdict'>

/** `loose sand`, `loose sand and firm mud`, `loose sand, firm mud and gravel`. */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words.join('')
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`
}

const on = (seabed: Seabed) => seabedFacts(seabed).name

/** The likelier of the two in front, with its chance. */
function leading([first, second]: readonly [string, string], chance: number): { ahead: string, behind: string, chance: number } {
  return chance >= 0.5 ? { ahead: first, behind: second, chance } : { ahead: second, behind: first, chance: 1 - chance }
}

/**
 * The verdict on two anchors on one seabed as a sentence, the likelier one first.
 *
 * @param names what the two are called, in the order of the pair
 */
export function pairInWords(names: readonly [string, string], { chance, verdict }: Judged, seabed: Seabed): string {
  const { ahead, behind, chance: share } = leading(names, chance)
  if (verdict === 'notTested') return `Too few pulls on ${on(seabed)} to judge ${ahead} against ${behind}.`
  if (verdict === 'cannotTell') return `Cannot tell ${ahead} and ${behind} apart on ${on(seabed)}: ${ahead} is ahead with a chance of ${inPercent(share)}, a coin-toss.`
  return `${ahead} ${verdict === 'veryLikely' ? 'very likely' : 'more likely than not'} holds more than ${behind} on ${on(seabed)}: a chance of ${inPercent(share)}.`
}

/** Seabeds where the pair has one verdict with the same anchor ahead. */
function placesOf(seabeds: readonly (Judged & { seabed: Seabed })[], verdicts: readonly ComparisonVerdict[], firstAhead?: boolean): string[] {
  return seabeds.filter(({ verdict, chance }) => verdicts.includes(verdict) && (firstAhead === undefined || (chance >= 0.5) === firstAhead))
    .map(({ seabed }) => on(seabed))
}

/**
 * One sentence about two anchors over all the seabeds of a comparison: where either is ahead, where they cannot be told apart,
 * and where too few pulls were made.
 *
 * @param names what the two are called, in the order of the pair
 */
export function summaryOf(names: readonly [string, string], seabeds: readonly (Judged & { seabed: Seabed })[]): string {
  const [first, second] = names
  const clauses: string[] = []
  for (const [name, ahead] of [[first, true], [second, false]] as const) {
    const very = placesOf(seabeds, ['veryLikely'], ahead)
    const more = placesOf(seabeds, ['moreLikely'], ahead)
    const parts = [...very.length > 0 ? [`very likely on ${listed(very)}`] : [], ...more.length > 0 ? [`more likely than not on ${listed(more)}`] : []]
    if (parts.length > 0) clauses.push(`${name} holds more, ${parts.join(', ')}`)
  }
  const even = placesOf(seabeds, ['cannotTell'])
  const thin = placesOf(seabeds, ['notTested'])
  if (even.length > 0) clauses.push(`the pulls cannot tell them apart on ${listed(even)}`)
  if (thin.length > 0) clauses.push(`too few pulls were made to judge by on ${listed(thin)}`)
  return clauses.length === 0 ? `${first} against ${second}: nothing is known of both on any of these seabeds.` : `${first} against ${second}: ${clauses.join('; ')}.`
}

/** The pair's verdicts over the seabeds of an answer. */
export function verdictsOf(seabeds: readonly Pick<ComparedSeabed, 'seabed' | 'pairs'>[], first: number, second: number): (Judged & { seabed: Seabed })[] {
  return seabeds.flatMap(({ seabed, pairs }) => {
    const pair = pairs.find(entry => entry.first === first && entry.second === second)
    return pair === undefined ? [] : [{ seabed, chance: pair.chance, verdict: pair.verdict }]
  })
}
