import { fieldsOf, slug } from './fields'
import { rankingRequest } from './ranking'

/** GET /api/modifications */
export const modificationsQuery = fieldsOf({}, 'All modifications')

/** GET /api/modifications/{slug} */
export const modificationParams = fieldsOf({ slug: slug('Its name in the address') }, 'Which modification')

/** POST /api/modification-worths */
export const modificationWorthRequest = fieldsOf({
  modification: slug('Slug of the modification'),
  plan: rankingRequest,
}, 'What is this change worth for my plan? Its seabeds play no part: every seabed that it was tried on is answered')
