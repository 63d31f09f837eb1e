import { visitor } from '#shared/access/mayRead'
import { estimatesQuery } from '#shared/schemas/catalogue'
import { estimates } from '../services/catalogue'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** What the newest fit says of each design on each seabed. */
export default apiHandler(event => estimates(visitor, validate(estimatesQuery, queryOf(event.path))))
