import type { ModificationListing, ModificationRatio, ModificationWorth, SeabedWorth, Span } from '#shared/types/modification'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { Show } from '~/utils/show'
import { moneyInWords } from '~/utils/money'

type Verdict = ModificationRatio['verdict']

/** The verdict on a ratio in a word or two. */
export const verdictWords = (verdict: Verdict): string =>
  verdict === null ? 'no pairs, no verdict' : { better: 'better', worse: 'worse', noDifference: 'no difference that matters', cannotTell: 'cannot tell' }[verdict]

/** `a`, `a and b`, `a, b and c`. */
export const listWords = (words: readonly string[]): string => words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`

/** With its sign, a true minus: `+2.1 kN`, `−4 kn`. */
export const signed = (value: number, format: (size: number) => string): string => `${value < 0 ? '−' : '+'}${format(Math.abs(value))}`

/**
 * `−2.1 kN (−2.7 to −1.3)`: a change with its 90 % interval.
 *
 * @param format with the unit
 * @param bare without it
 */
export function changeWords({ median, low90, high90 }: Span, format: (size: number) => string, bare: (size: number) => string): string {
  return `${signed(median, format)} (${signed(low90, bare)} to ${signed(high90, bare)})`
}

const on = ({ seabed }: { seabed: ModificationRatio['seabed'] }) => seabedFacts(seabed).name

/** Does it matter, and where? One answer from the verdicts. */
export function answerInWords({ ratios }: Pick<ModificationListing, 'ratios'>): string {
  const where = (verdict: Verdict) => [...new Set(ratios.filter(ratio => ratio.verdict === verdict).map(on))]
  const clause = (verdict: Verdict, words: string) => where(verdict).length > 0 ? [`${words} on ${listWords(where(verdict))}`] : []
  const clauses = [
    ...clause('better', 'it holds more'), ...clause('worse', 'it holds less'), ...clause('noDifference', 'it makes no difference that matters'),
    ...clause('cannotTell', 'the pulls cannot tell'), ...clause(null, 'there are no back-to-back pairs, so no verdict,'),
  ]
  if (clauses.length === 0) return 'Nobody has pulled it yet.'
  if (where('better').length + where('worse').length > 0) return `Yes: ${clauses.join('; ')}.`
  if (clauses.length === 1 && where('noDifference').length > 0) return `No: ${clauses[0]}.`
  const text = clauses.join('; ')
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`
}

/** What it costs and weighs, as far as it is stated. */
export function costInWords({ price, addedMassKg }: Pick<ModificationListing, 'price' | 'addedMassKg'>, show: Show): string {
  const weight = addedMassKg === null ? null : `${addedMassKg < 0 ? 'takes off' : 'adds'} ${show.mass(Math.abs(addedMassKg))}`
  const mass = weight === null ? 'what it weighs is not stated' : `it ${weight}`
  if (price === null) return `No price is stated; ${mass}.`
  const money = `It costs ${moneyInWords(price.minor, price.currency)}`
  return weight === null ? `${money}; ${mass}.` : `${money} and ${weight}.`
}

interface Priced { design: string, massKg: number, price: { minor: number, currency: string } | null }

/** The lightest listed size that would hold as much by weight alone, and what more it costs; null where none is listed or the change takes holding away. */
export function byWeight(worth: SeabedWorth, massKg: number, sizes: readonly Priced[]): { massKg: number, extra: string | null } | null {
  if (worth.sameAsKg.median <= massKg) return null
  const own = sizes.filter(({ design }) => design === worth.design).sort((a, b) => a.massKg - b.massKg)
  const bigger = own.find(size => size.massKg >= worth.sameAsKg.median)
  if (!bigger) return null
  const [now, then] = [own.find(size => size.massKg === massKg)?.price, bigger.price]
  return { massKg: bigger.massKg, extra: now && then && now.currency === then.currency ? moneyInWords(then.minor - now.minor, then.currency) : null }
}

const largest = (entries: readonly SeabedWorth[]) => [...entries].sort((a, b) => Math.abs(b.changeN.median) - Math.abs(a.changeN.median))[0]

function gain(worth: SeabedWorth, show: Show): string {
  const { changeN, changeMs } = worth
  const wind = changeMs === null ? '' : ` and ${show.speed(Math.abs(changeMs.gust.median))} of gusting wind`
  return `${show.force(Math.abs(changeN.median))} of holding${wind} on ${on(worth)}`
}

/**
 * Whether the change is worth what it costs, as far as the pulls say: what it buys where it is better, what leaving it undone
 * is worth where it is worse, that it buys nothing that matters, or that the pulls cannot tell.
 */
export function judgeWorth(listing: Pick<ModificationListing, 'price'>, { seabeds, massKg }: ModificationWorth, sizes: readonly Priced[], show: Show): string[] {
  const cost = listing.price === null ? 'Whatever it costs,' : `For ${moneyInWords(listing.price.minor, listing.price.currency)}`
  const of = (verdict: Verdict) => seabeds.filter(worth => worth.verdict === verdict)
  const [better, worse] = [largest(of('better')), largest(of('worse'))]
  const sentences: string[] = []
  if (better) {
    const size = byWeight(better, massKg, sizes)
    const weight = size === null ? '' : ` By weight alone that takes the size of ${show.mass(size.massKg)}${size.extra === null ? '' : `, ${size.extra} more`}.`
    sentences.push(`${cost} it buys about ${gain(better, show)}.${weight}`)
  }
  if (worse) sentences.push(`${cost} it takes away about ${gain(worse, show)}: leaving the anchor as it is, is worth that much.`)
  if (of('noDifference').length > 0) sentences.push(`${cost} it buys no holding that matters on ${listWords(of('noDifference').map(on))}.`)
  const unsure = [...of('cannotTell'), ...of(null)]
  if (unsure.length > 0) sentences.push(`On ${listWords(unsure.map(on))} the pulls cannot tell whether it is worth anything.`)
  return sentences
}
