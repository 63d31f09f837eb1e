import { randomUUID } from 'node:crypto'
import type { H3Event } from 'h3'

declare module 'h3' {
  interface H3EventContext { requestId?: string }
}

/** The path alone, no query (it may hold what a log must not), no slash at its end. */
export function pathOf(event: H3Event): string {
  const path = event.path.split('?', 1)[0] ?? '/'
  return path.length > 1 ? path.replace(/\/+$/, '') || '/' : path
}

/** One random name a request, sent as X-Request-Id and written in the log. */
export function requestId(event: H3Event): string {
  event.context.requestId ??= randomUUID()
  return event.context.requestId
}
