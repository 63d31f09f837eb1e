import { visitor } from '#shared/access/mayRead'
import { atMassQuery } from '#shared/schemas/reading'
import { designBySlug } from '../../services/designPages'
import { apiHandler } from '../../utils/handler'
import { slugOf } from '../../utils/slug'
import { queryOf, validate } from '../../utils/validate'

/** A design with all that was pulled of it. */
export default apiHandler((event) => {
  const { massKg } = validate(atMassQuery, queryOf(event.path))
  return designBySlug(visitor, slugOf(event), massKg)
})
