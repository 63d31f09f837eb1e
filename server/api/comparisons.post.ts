import { setResponseHeaders } from 'h3'
import { visitor } from '#shared/access/mayRead'
import { comparisonRequest } from '#shared/schemas/comparison'
import { comparisons } from '../services/comparisons'
import { readRequest } from '../utils/body'
import { apiHandler } from '../utils/handler'

/** Which of these anchors holds more. The answer may depend on who asks: it is never stored, nor shared between askers. */
export default apiHandler(async (event) => {
  setResponseHeaders(event, { 'Cache-Control': 'private, no-store', 'Vary': 'Cookie, Authorization, Origin' })
  return comparisons(visitor, await readRequest(event, comparisonRequest))
})
