import * as z from 'zod/mini'
import { fieldsOf } from '../fields'
import { flag, words } from './figures'

/** Words for programs: what kind of refusal it is. */
export const problemCodes = [
  'badRequest', 'emptyBody', 'notJson', 'notFound', 'methodNotAllowed', 'tooSlow', 'tooLarge', 'unsupportedType',
  'wrongHost', 'invalid', 'tooMany', 'busy', 'internal', 'unavailable', 'noFitYet',
] as const

/** The one error shape. */
export const problem = fieldsOf({
  statusCode: z.int(),
  code: z.enum(problemCodes).check(z.describe('A word for programs')),
  message: words('A sentence for people'),
  fields: z.optional(z.record(z.string(), z.string()).check(z.describe('What is wrong with which field, by its dotted path'))),
}, 'A refusal')

export const aliveAnswer = fieldsOf({ alive: flag('The server answers') }, 'Alive')

export const readyAnswer = fieldsOf({
  ready: flag('All of the rest'),
  database: flag('The database is reachable'),
  migrated: flag('It has its tables'),
  fit: flag('There is a fit to answer from'),
}, 'Ready')
