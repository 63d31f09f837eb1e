import { visitor } from '#shared/access/mayRead'
import { noQuery } from '#shared/schemas/reading'
import { trialBySlug } from '../../services/trialPages'
import { apiHandler } from '../../utils/handler'
import { slugOf } from '../../utils/slug'
import { queryOf, validate } from '../../utils/validate'

/** A trial with its rig, its day and its plain means beside the estimates. */
export default apiHandler((event) => {
  validate(noQuery, queryOf(event.path))
  return trialBySlug(visitor, slugOf(event))
})
