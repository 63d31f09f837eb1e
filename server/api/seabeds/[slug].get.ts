import { visitor } from '#shared/access/mayRead'
import { atMassQuery } from '#shared/schemas/reading'
import { seabedBySlug } from '../../services/seabedPages'
import { apiHandler } from '../../utils/handler'
import { slugOf } from '../../utils/slug'
import { queryOf, validate } from '../../utils/validate'

/** A seabed and the designs on it. */
export default apiHandler((event) => {
  const { massKg } = validate(atMassQuery, queryOf(event.path))
  return seabedBySlug(visitor, slugOf(event), massKg)
})
