import { visitor } from '#shared/access/mayRead'
import { modificationsQuery } from '#shared/schemas/modification'
import { modifications } from '../../services/modifications'
import { apiHandler } from '../../utils/handler'
import { queryOf, validate } from '../../utils/validate'

/** Every modification with what the pulls say of it. */
export default apiHandler((event) => {
  validate(modificationsQuery, queryOf(event.path))
  return modifications(visitor)
})
