import { defineEventHandler, sendNoContent, setResponseHeader } from 'h3'
import { allowedMethods } from '../utils/operations'
import { methodNotAllowed } from '../utils/problem'
import { pathOf } from '../utils/request'

/** Refuses a method that the address does not know, with the ones it does; HEAD is answered wherever GET is. */
export default defineEventHandler((event) => {
  const allowed = allowedMethods(pathOf(event))
  if (!allowed) return
  if (event.method === 'OPTIONS') {
    setResponseHeader(event, 'Allow', allowed.join(', '))
    return sendNoContent(event)
  }
  if (!allowed.includes(event.method)) throw methodNotAllowed(event.method, allowed)
  // Routes are found by method: from here on a HEAD is a GET whose body Node.js leaves out.
  if (event.method === 'HEAD') event._method = 'GET'
})
