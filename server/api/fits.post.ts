import { fitRequest } from '#shared/schemas/fit'
import { fits } from '../services/fits'
import { readRequest } from '../utils/body'
import { apiHandler, goneSignal } from '../utils/handler'

/** 5 000 pulls with long names. */
const bytes = 1_500_000

/** What would these pulls say? Nothing is stored. */
export default apiHandler(async event => fits(await readRequest(event, fitRequest, { bytes, timeMs: 30_000 }), goneSignal(event)))
