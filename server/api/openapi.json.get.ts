import { openapi } from '../services/openapi'
import { apiHandler } from '../utils/handler'

/** The API, described for programs. */
export default apiHandler(() => openapi())
