import { choiceWords, quantityWords, windageKeys } from '~/utils/plan/words'
import type { ChoiceKey, QuantityKey, WindageKey } from '~/utils/plan/words'

/** What a control is called when it is spoken of away from where it stands. */
export function labelOf(key: string): string {
  if (Object.hasOwn(quantityWords, key)) return quantityWords[key as QuantityKey].label
  if (Object.hasOwn(choiceWords, key)) return choiceWords[key as ChoiceKey].label
  if (key.startsWith('bed')) return 'Seabeds'
  if (key === 'own') return 'My own anchor'
  const part = key.replace(/cd$/, '')
  if (Object.hasOwn(windageKeys, part)) return `${windageKeys[part as WindageKey]}, ${key === part ? 'area' : 'drag coefficient'}`
  return 'The plan'
}
