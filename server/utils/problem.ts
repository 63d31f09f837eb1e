import { getRequestHeader, send, setResponseHeader, setResponseHeaders, setResponseStatus, type H3Event } from 'h3'
import { ApiError, logFailure, toProblem, type Problem } from './errors'
import { pathOf, requestId } from './request'

/** Refusals that must stay cheap to send: no page is rendered for them. */
const bare = new Set([405, 408, 413, 415, 421, 429])

const wantsPage = (event: H3Event) => (getRequestHeader(event, 'accept') ?? '').includes('text/html')

/** True where a person should see the rendered error page: outside the API and the built files, for a browser that asks for HTML. */
export function showsPage(event: H3Event, statusCode: number): boolean {
  const path = pathOf(event)
  return wantsPage(event) && !/^\/(?:api|_nuxt)(?:\/|$)/.test(path) && !bare.has(statusCode)
}

const escaped = (text: string) => text.replace(/[&<>"]/g, sign => `&#${sign.charCodeAt(0)};`)

/** A page without script or style, for a browser that is told to wait. */
const smallPage = ({ statusCode, message }: Problem) =>
  `<!doctype html><html lang="en"><meta charset="utf-8"><title>${statusCode}</title><h1>${statusCode}</h1><p>${escaped(message)}</p></html>`

/** Sends whatever was thrown in the one error shape. */
export async function sendProblem(event: H3Event, error: unknown): Promise<void> {
  if (event.handled) return
  const { problem, headers } = toProblem(error)
  logFailure(error, problem, { id: requestId(event), method: event.method, path: pathOf(event) })
  const asPage = wantsPage(event) && bare.has(problem.statusCode) && !pathOf(event).startsWith('/api/')
  event.node.res.statusMessage = ''
  setResponseStatus(event, problem.statusCode)
  setResponseHeaders(event, headers)
  setResponseHeader(event, 'Cache-Control', 'no-store')
  setResponseHeader(event, 'Content-Type', asPage ? 'text/html; charset=utf-8' : 'application/json; charset=utf-8')
  await send(event, asPage ? smallPage(problem) : JSON.stringify(problem))
}

export const notFound = () => new ApiError(404, 'notFound', 'There is nothing at this address')

/** 405 with the methods that are allowed. */
export function methodNotAllowed(method: string, allowed: readonly string[]): ApiError {
  const list = allowed.join(', ')
  return new ApiError(405, 'methodNotAllowed', `${method} is not allowed here, only ${list}`, { headers: { Allow: list } })
}
