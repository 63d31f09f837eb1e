import { visitor } from '#shared/access/mayRead'
import { seabedsQuery } from '#shared/schemas/catalogue'
import { seabeds } from '../services/catalogue'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** Every seabed and what it is. */
export default apiHandler((event) => {
  validate(seabedsQuery, queryOf(event.path))
  return seabeds(visitor)
})
