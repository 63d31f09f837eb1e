import { readNumber } from '#shared/units/number'
import { parseQuantity } from '#shared/units/parse'
import { tidy } from '#shared/units/tidy'
import type { QuantityKind, UnitSystem } from '#shared/units/systems'

/** A typed quantity: nothing typed, read, or refused with a sentence that says what is accepted. */
export type Reading =
  | { state: 'blank' }
  | { state: 'read', value: number, understood: string, sizeIn?: string, beaufort?: number }
  | { state: 'refused', error: string }

const wordsForNone = new Set(['', '-', '–', 'none', 'no'])

function readPlainNumber(text: string, min: number, max: number): Reading {
  const number = readNumber(tidy(text))
  if (number && number.rest.trim() === '' && number.value >= min && number.value <= max) {
    return { state: 'read', value: number.value, understood: String(number.value) }
  }
  return { state: 'refused', error: `Type a number between ${min} and ${max}.` }
}

/**
 * Reads one typed word in SI: m, kg, m/s, N, m2, m for a diameter, rad, part of one. `none` and `no` say nothing, like a blank.
 *
 * @param text as typed
 * @param kind the quantity wanted, or a plain number
 * @param system units that a bare number is read in
 * @param min least allowed value, SI
 * @param max greatest allowed value, SI
 */
export function readQuantity(text: string, kind: QuantityKind | 'number', system: UnitSystem, min: number, max: number): Reading {
  if (wordsForNone.has(text.trim().toLowerCase())) return { state: 'blank' }
  if (kind === 'number') return readPlainNumber(text, min, max)
  const read = parseQuantity(text, kind, { system, min, max })
  return 'error' in read ? { state: 'refused', error: read.error } : { state: 'read', ...read }
}
