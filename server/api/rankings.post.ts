import { setResponseHeaders } from 'h3'
import { visitor } from '#shared/access/mayRead'
import { rankingRequest } from '#shared/schemas/ranking'
import { rankings } from '../services/rankings'
import { readRequest } from '../utils/body'
import { apiHandler } from '../utils/handler'

/** Which designs hold for this plan. The answer may depend on who asks: it is never stored, nor shared between askers. */
export default apiHandler(async (event) => {
  setResponseHeaders(event, { 'Cache-Control': 'private, no-store', 'Vary': 'Cookie, Authorization, Origin' })
  return rankings(visitor, await readRequest(event, rankingRequest))
})
