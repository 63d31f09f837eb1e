import { visitor } from '#shared/access/mayRead'
import { releasesQuery } from '#shared/schemas/release'
import { releases } from '../services/releases'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** Every release with its files and what changed. */
export default apiHandler((event) => {
  validate(releasesQuery, queryOf(event.path))
  return releases(visitor)
})
