import { rodeRequest } from '#shared/schemas/rode'
import { rodes } from '../services/rodes'
import { readRequest } from '../utils/body'
import { apiHandler } from '../utils/handler'

/** How the rode passes a load to the shank, and what bears it. */
export default apiHandler(async event => rodes(await readRequest(event, rodeRequest)))
