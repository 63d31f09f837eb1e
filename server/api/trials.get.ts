import { visitor } from '#shared/access/mayRead'
import { trialsQuery } from '#shared/schemas/reading'
import { trialPage } from '../services/trialPages'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** A page of the trials, newest first. */
export default apiHandler(event => trialPage(visitor, validate(trialsQuery, queryOf(event.path))))
