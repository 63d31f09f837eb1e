import { visitor } from '#shared/access/mayRead'
import { designsQuery } from '#shared/schemas/catalogue'
import { designs } from '../services/catalogue'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** Every design with its sizes. */
export default apiHandler(event => designs(visitor, validate(designsQuery, queryOf(event.path))))
