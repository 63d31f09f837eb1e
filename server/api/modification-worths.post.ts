import { setResponseHeaders } from 'h3'
import { visitor } from '#shared/access/mayRead'
import { modificationWorthRequest } from '#shared/schemas/modification'
import { modificationWorths } from '../services/modifications'
import { readRequest } from '../utils/body'
import { apiHandler } from '../utils/handler'

/** What a modification is worth for a plan. The answer may depend on who asks: it is never stored, nor shared between askers. */
export default apiHandler(async (event) => {
  setResponseHeaders(event, { 'Cache-Control': 'private, no-store', 'Vary': 'Cookie, Authorization, Origin' })
  return modificationWorths(visitor, await readRequest(event, modificationWorthRequest))
})
