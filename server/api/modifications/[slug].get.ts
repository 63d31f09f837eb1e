import { visitor } from '#shared/access/mayRead'
import { modificationsQuery } from '#shared/schemas/modification'
import { modification } from '../../services/modifications'
import { apiHandler } from '../../utils/handler'
import { slugOf } from '../../utils/slug'
import { queryOf, validate } from '../../utils/validate'

/** One modification, the pairs behind it and what it is worth for a reference plan. */
export default apiHandler((event) => {
  validate(modificationsQuery, queryOf(event.path))
  return modification(visitor, slugOf(event))
})
