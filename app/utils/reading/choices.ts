import { readQuantity } from '~/utils/plan/quantity'
import type { UnitSystem } from '#shared/units/systems'

type Query = Readonly<Record<string, string | null | readonly (string | null)[] | undefined>>

/** Reads a text of the address; undefined where it says nothing that is known. */
export type Reader<T> = (text: string) => T | undefined

export interface Ignored { key: string, text: string }

/** One of some words. */
export const wordOf = <T extends string>(words: readonly T[]): Reader<T> => text => words.find(word => word === text)

/** A whole number in an interval. */
export const wholeOf = (minimum: number, maximum: number): Reader<number> => (text) => {
  const value = /^\d{1,9}$/.test(text) ? Number(text) : Number.NaN
  return value >= minimum && value <= maximum ? value : undefined
}

/** A mass as readers type it, kg; a bare number is in their own unit. */
export const massOf = (system: UnitSystem): Reader<number> => (text) => {
  const reading = readQuantity(text, 'mass', system, 0.5, 2000)
  return reading.state === 'read' ? Math.round(reading.value * 1000) / 1000 : undefined
}

/** Any text of one line, cut to a length. */
export const textOf = (longest: number): Reader<string> => text => /^[^\p{Cc}]+$/u.test(text) && text.length <= longest ? text : undefined

/**
 * Reads the choices of a page from its address. A blank chooses nothing; what cannot be read is ignored and named, so that the
 * page can say so.
 */
export function readChoices<Readers extends Record<string, Reader<unknown>>>(query: Query, readers: Readers) {
  const values: Record<string, unknown> = {}
  const typed: Record<string, string> = {}
  const ignored: Ignored[] = []
  for (const [key, read] of Object.entries(readers)) {
    const given = [query[key] ?? []].flat()
    const text = (given.at(-1) ?? '').trim()
    if (text === '') continue
    const value = read(text)
    if (value === undefined) {
      ignored.push({ key, text: text.slice(0, 40) })
      continue
    }
    values[key] = value
    typed[key] = text
  }
  return { values: values as { [K in keyof Readers]?: Exclude<ReturnType<Readers[K]>, undefined> }, typed: typed as { [K in keyof Readers]?: string }, ignored }
}

/** An address of this site: path and the choices that say something. */
export function addressOf(path: string, choices: Readonly<Record<string, string | number | undefined>>): string {
  const query = new URLSearchParams(Object.entries(choices).filter(([, value]) => value !== undefined && value !== '').map(([key, value]) => [key, String(value)]))
  const text = query.toString()
  return text ? `${path}?${text}` : path
}
