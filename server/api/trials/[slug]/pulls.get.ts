import { visitor } from '#shared/access/mayRead'
import { noQuery } from '#shared/schemas/reading'
import { trialPulls } from '../../../services/trialPages'
import { apiHandler } from '../../../utils/handler'
import { slugOf } from '../../../utils/slug'
import { queryOf, validate } from '../../../utils/validate'

/** Every pull of a trial. */
export default apiHandler((event) => {
  validate(noQuery, queryOf(event.path))
  return trialPulls(visitor, slugOf(event))
})
