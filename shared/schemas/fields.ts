import * as z from 'zod/mini'

type Issue = Parameters<z.core.$ZodErrorMap>[0]

/** A number as the messages print it: 1000000 -> "1 000 000". */
const printed = (value: number): string => Number.isInteger(value) ? String(value).replace(/\B(?=(\d{3})+$)/g, ' ') : String(value)

/** Words for a refused value: what is missing, else what it must be. They read well after the field's name and beside the field. */
export const saying = (what: string) => ({ error: (issue: Issue) => issue.input === undefined ? `is missing: it must be ${what}` : `must be ${what}` })

/** A finite number in a closed interval, its unit ('' for none) in the message and in the description. */
export function quantity(minimum: number, maximum: number, unit: string, description: string) {
  const words = saying(`a number between ${printed(minimum)} and ${printed(maximum)}${unit && ` ${unit}`}`)
  return z.number(words).check(z.minimum(minimum, words), z.maximum(maximum, words), z.describe(unit ? `${description} (${unit})` : description))
}

/** One of a closed list of words. */
export function oneOf<const T extends readonly [string, ...string[]]>(words: T, description: string) {
  return z.enum(words, saying(`one of ${words.join(', ')}`)).check(z.describe(description))
}

/** One of a closed list of numbers. */
export function oneOfNumbers<const T extends readonly number[]>(numbers: T, description: string, why = '') {
  return z.literal(numbers, saying(`one of ${numbers.join(', ')}${why}`)).check(z.describe(description))
}

/** A short text on one line: no control characters, so that it may stand in a table or a log. */
export function shortText(maximum: number, description: string) {
  const words = saying(`a text of 1 to ${maximum} characters on one line`)
  return z.string(words).check(z.minLength(1, words), z.maxLength(maximum, words), z.regex(/^[^\p{Cc}]+$/u, words), z.describe(description))
}

/** The name a thing has in an address: lower-case letters, digits and single hyphens. */
export function slug(description: string) {
  const words = saying('a name such as firm-mud: 1 to 80 lower-case letters, digits and single hyphens')
  return z.string(words).check(z.maxLength(80, words), z.regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, words), z.describe(description))
}

export function yesOrNo(description: string) {
  return z.boolean(saying('true or false')).check(z.describe(description))
}

/** An object that refuses keys it does not know. */
export function fieldsOf<T extends z.core.$ZodLooseShape>(shape: T, description: string) {
  return z.strictObject(shape, saying('an object')).check(z.describe(description))
}

/** A list with a stated least and greatest length. */
export function listOf<T extends z.core.SomeType>(element: T, minimum: number, maximum: number, description: string) {
  const words = saying(`a list of ${minimum} to ${printed(maximum)} entries`)
  return z.array(element, words).check(z.minLength(minimum, words), z.maxLength(maximum, words), z.describe(description))
}
