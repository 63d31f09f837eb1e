import { notationQuery } from '#shared/schemas/notation'
import { notation } from '../services/notation'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** A seabed as the chart prints it, read. */
export default apiHandler(event => notation(validate(notationQuery, queryOf(event.path)).text))
