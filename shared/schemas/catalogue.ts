import * as z from 'zod/mini'
import { numberedSeabeds } from '#shared/types/words'
import { fieldsOf, oneOf, slug } from './fields'

/** GET /api/seabeds */
export const seabedsQuery = fieldsOf({}, 'All seabeds')

/** GET /api/estimates */
export const estimatesQuery = fieldsOf({
  seabed: z.optional(oneOf(numberedSeabeds, 'Only on this seabed')),
  design: z.optional(slug('Only of this design')),
}, 'Which estimates')
