import { loadRequest } from '#shared/schemas/load'
import { loads } from '../services/loads'
import { readRequest } from '../utils/body'
import { apiHandler } from '../utils/handler'

/** What the boat asks of the anchor. */
export default apiHandler(async event => loads(await readRequest(event, loadRequest)))
