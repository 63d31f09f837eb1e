import { defineEventHandler, setResponseHeader, type EventHandler, type H3Event } from 'h3'
import { countRequest } from './limits'

/**
 * A route of the API: counted against the budget of the client's address, its answer stored nowhere.
 * What it throws becomes the one error shape in server/plugins/errors.ts.
 */
export function apiHandler<Answer>(answer: (event: H3Event) => Answer | Promise<Answer>): EventHandler {
  return defineEventHandler(async (event) => {
    countRequest(event)
    setResponseHeader(event, 'Cache-Control', 'no-store')
    return answer(event)
  })
}

/** Ends when the client has gone away before its answer was sent, so that work for nobody can stop. */
export function goneSignal(event: H3Event): AbortSignal {
  const gone = new AbortController()
  event.node.res.once('close', () => {
    if (!event.node.res.writableFinished) gone.abort()
  })
  return gone.signal
}
