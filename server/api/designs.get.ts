import { visitor } from '#shared/access/mayRead'
import { designsQuery } from '#shared/schemas/reading'
import { designPage } from '../services/designPages'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** A page of the designs. */
export default apiHandler(event => designPage(visitor, validate(designsQuery, queryOf(event.path))))
