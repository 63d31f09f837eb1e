import { visitor } from '#shared/access/mayRead'
import { noQuery } from '#shared/schemas/reading'
import { namesOfDesigns } from '../services/designPages'
import { apiHandler } from '../utils/handler'
import { queryOf, validate } from '../utils/validate'

/** Every design's name, for a choice. */
export default apiHandler((event) => {
  validate(noQuery, queryOf(event.path))
  return namesOfDesigns(visitor)
})
