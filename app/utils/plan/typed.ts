import { seabeds } from '#shared/types/words'
import type { Seabed } from '#shared/types/words'
import { choiceKeys, choiceWords, mostSeabeds, quantityKeys, quantityWords, sentenceKeys, windageKeyList } from '~/utils/plan/words'
import type { ChoiceKey, QuantityKey, WindageKey } from '~/utils/plan/words'

/** A seabed of the mix with its share as typed; blank where the reader named none. */
export interface TypedBed { seabed: Seabed | '', share: string }

/** A plan exactly as typed: the one state of the page, and what the address carries. */
export interface TypedPlan {
  words: Record<QuantityKey, string>
  choices: Record<ChoiceKey, string>
  areas: Record<WindageKey, string>
  drags: Record<WindageKey, string>
  beds: TypedBed[]
  own: string
}

export type Query = Readonly<Record<string, string | null | readonly (string | null)[] | undefined>>

const longest = 40
const clean = (text: string | null | undefined): string => (text ?? '').slice(0, longest).trim()

/** All values of a key, as typed. */
const all = (query: Query, key: string): string[] => [query[key] ?? []].flat().map(clean)

/** Where a key stands more than once, the last wins: a preset button follows its input. */
const last = (query: Query, key: string): string | undefined => all(query, key).at(-1)

export const isSeabed = (text: string): text is Seabed => (seabeds as readonly string[]).includes(text)

const startBeds: readonly TypedBed[] = [{ seabed: 'sandy-mud', share: '60 %' }, { seabed: 'loose-sand', share: '40 %' }]

function readBeds(query: Query): TypedBed[] {
  const names = all(query, 'bed')
  if (query.bed === undefined) return startBeds.map(bed => ({ ...bed }))
  const shares = all(query, 'share')
  return names.map((name, index) => ({ seabed: isSeabed(name) ? name : '' as const, share: shares[index] ?? '' }))
    .filter(({ seabed }) => seabed !== '').slice(0, mostSeabeds)
}

/** Keys and values of an object by the same function of its keys. */
const record = <K extends string, V>(keys: readonly K[], value: (key: K) => V): Record<K, V> =>
  Object.fromEntries(keys.map(key => [key, value(key)])) as Record<K, V>

/**
 * Reads the address. A word that is missing says what it says at first; a word that is there but blank stays blank. Unknown keys and
 * choices are left out.
 */
export function readQuery(query: Query): TypedPlan {
  return {
    words: record(quantityKeys, key => last(query, key) ?? quantityWords[key].start),
    choices: record(choiceKeys, (key) => {
      const { options, start } = choiceWords[key]
      const text = last(query, key)
      return text !== undefined && Object.hasOwn(options, text) ? text : start
    }),
    areas: record(windageKeyList, key => last(query, key) ?? ''),
    drags: record(windageKeyList, key => last(query, `${key}cd`) ?? ''),
    beds: readBeds(query),
    own: (last(query, 'own') ?? '').replace(/[^a-z0-9-]/g, ''),
  }
}

/** Writes the address: the sentence's own words always, everything else only where it says something. */
export function writeQuery(plan: TypedPlan): Record<string, string | string[]> {
  const query: Record<string, string | string[]> = { type: plan.choices.type }
  for (const key of quantityKeys) {
    const text = clean(plan.words[key])
    if (text || sentenceKeys.includes(key)) query[key] = text
  }
  for (const key of choiceKeys) if (plan.choices[key] !== choiceWords[key].start) query[key] = plan.choices[key]
  for (const key of windageKeyList) {
    if (clean(plan.areas[key])) query[key] = clean(plan.areas[key])
    if (clean(plan.drags[key])) query[`${key}cd`] = clean(plan.drags[key])
  }
  const beds = plan.beds.filter(({ seabed }) => seabed !== '')
  query.bed = beds.length > 0 ? beds.map(({ seabed }) => seabed) : ''
  query.share = beds.map(({ share }) => clean(share))
  if (plan.own) query.own = plan.own
  return query
}
