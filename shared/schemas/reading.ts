import * as z from 'zod/mini'
import { designSorts } from '#shared/types/reading'
import { families, numberedSeabeds } from '#shared/types/words'
import { fieldsOf, oneOf, saying, slug } from './fields'

/** A number as an address writes it: digits, perhaps a point. */
function numberText(minimum: number, maximum: number, unit: string, description: string, form = /^\d{1,6}(?:\.\d{1,3})?$/) {
  const words = saying(`a number between ${minimum} and ${maximum}${unit && ` ${unit}`}`)
  const text = z.string(words).check(
    z.regex(form, words), z.refine(value => Number(value) >= minimum && Number(value) <= maximum, words), z.describe(unit ? `${description} (${unit})` : description))
  return z.pipe(text, z.transform(Number))
}

const page = z.optional(numberText(1, 100_000, '', 'Which page, fifty a page', /^\d{1,6}$/))
const massKg = z.optional(numberText(0.5, 2000, 'kg', 'Anchor mass'))

const searchWords = saying('a text of 1 to 60 characters on one line')
const search = z.string(searchWords).check(
  z.minLength(1, searchWords), z.maxLength(60, searchWords), z.regex(/^[^\p{Cc}]+$/u, searchWords), z.describe('Words in the name, the family or the description'))

/** GET /api/designs */
export const designsQuery = fieldsOf({
  search: z.optional(search),
  family: z.optional(oneOf(families, 'Only designs of this family')),
  seabed: z.optional(oneOf(numberedSeabeds, 'Only designs pulled on this seabed')),
  massKg: z.optional(numberText(0.5, 2000, 'kg', 'Only designs with a size within a fifth of this mass')),
  tested: z.optional(oneOf(['yes', 'no'], 'Only designs that were pulled, or that were not')),
  sort: z.optional(oneOf(designSorts, 'Order; holding needs a seabed')),
  page,
}, 'Which designs')

/** GET /api/designs/{slug}, GET /api/seabeds/{slug} */
export const atMassQuery = fieldsOf({ massKg }, 'At which mass')

/** GET /api/trials */
export const trialsQuery = fieldsOf({
  seabed: z.optional(oneOf(numberedSeabeds, 'Only trials with pulls on this seabed')),
  design: z.optional(slug('Only trials with pulls of this design')),
  page,
}, 'Which trials')

export const noQuery = fieldsOf({}, 'Nothing to choose')
export const slugParams = fieldsOf({ slug: slug('Its name in the address') }, 'Which one')
export const pullParams = fieldsOf({ id: numberText(1, 2_147_483_647, '', 'Number of the pull', /^\d{1,10}$/) }, 'Which pull')

const questionWords = saying('a text of 10 to 2 000 characters')
const mailWords = saying('a mail address such as name@example.org')

/** POST /api/pulls/{id}/questions */
export const questionRequest = fieldsOf({
  question: z.string(questionWords).check(z.trim(), z.minLength(10, questionWords), z.maxLength(2000, questionWords),
    z.regex(/^[^\p{Cc}]*(?:[\r\n\t][^\p{Cc}]*)*$/u, questionWords), z.describe('What seems wrong')),
  mailAddress: z.string(mailWords).check(z.trim(), z.maxLength(254, mailWords), z.regex(/^[^\s@\p{Cc}]+@[^\s@\p{Cc}]+\.[^\s@\p{Cc}]+$/u, mailWords),
    z.describe('Where the reviewers may answer; never shown')),
}, 'Something wrong with this pull?')
