import type { problemCodes } from '#shared/schemas/answers/problem'
import { log } from './log'

/** What every refusal looks like on the wire; never a validator's dump, a query or a stack. */
export interface Problem {
  statusCode: number
  code: ProblemCode
  message: string
  /** what is wrong with which field, by its dotted path in the request */
  fields?: Record<string, string>
}

export type ProblemCode = (typeof problemCodes)[number]

/** A refusal by our own rules: services and utilities throw it, one translator sends it. */
export class ApiError extends Error {
  constructor(
    readonly statusCode: number,
    readonly code: ProblemCode,
    message: string,
    readonly more: { fields?: Record<string, string>, headers?: Record<string, string> } = {},
  ) {
    super(message)
    this.name = 'ApiError'
  }
}

/** 422: says what is wrong with each field; the message names the first. */
export function invalid(fields: Record<string, string>, total = Object.keys(fields).length): ApiError {
  const [first] = Object.entries(fields)
  const rest = total > 1 ? ` (and ${total - 1} more)` : ''
  return new ApiError(422, 'invalid', first ? `${first[0]} ${first[1]}${rest}` : 'The request cannot be answered', { fields })
}

const plain: Record<number, { code: ProblemCode, message: string }> = {
  400: { code: 'badRequest', message: 'The request cannot be read' },
  404: { code: 'notFound', message: 'There is nothing at this address' },
  405: { code: 'methodNotAllowed', message: 'This method is not allowed here' },
  413: { code: 'tooLarge', message: 'The request is too large' },
  415: { code: 'unsupportedType', message: 'Send JSON, with Content-Type: application/json' },
  421: { code: 'wrongHost', message: 'This server does not answer under that name' },
  429: { code: 'tooMany', message: 'Too many requests' },
  503: { code: 'unavailable', message: 'The service is not available just now' },
}

interface Loose { statusCode?: unknown, code?: unknown, cause?: unknown, field?: unknown, message?: unknown }
const loose = (error: unknown): Loose => typeof error === 'object' && error !== null ? error : {}

/** The error itself and what caused it, outermost first; a loop in the chain ends it. */
function chain(error: unknown): unknown[] {
  const links: unknown[] = []
  for (let link = error; link !== undefined && link !== null && !links.includes(link) && links.length < 8; link = loose(link).cause) links.push(link)
  return links
}

// By shape, not by class: an error that comes out of a worker thread keeps its fields but not its class.
const isFieldError = (error: unknown): error is RangeError & { field: string } => error instanceof RangeError && typeof loose(error).field === 'string'

/** Connections that failed, and PostgreSQL's own words for "not now": SQLSTATE classes 08, 53 and 57P. */
const notNow = /^(?:ECONN\w+|ENOTFOUND|EPIPE|ETIMEDOUT|EAI_AGAIN|08...|53...|57P..)$/
const isOutage = (error: unknown) => {
  const { code, message } = loose(error)
  return (typeof code === 'string' && notNow.test(code)) || (typeof message === 'string' && /^(?:Connection terminated|timeout exceeded when trying to connect)/.test(message))
}

/** A field's own message, without the field's name in front. */
const withoutName = (message: string, field: string) => message.startsWith(`${field} `) ? message.slice(field.length + 1) : message

/** Turns whatever was thrown into what the client may read, with the headers that go with it. */
export function toProblem(error: unknown): { problem: Problem, headers: Record<string, string> } {
  for (const link of chain(error)) {
    if (link instanceof ApiError) {
      const { statusCode, code, message, more } = link
      return { problem: { statusCode, code, message, ...(more.fields && { fields: more.fields }) }, headers: more.headers ?? {} }
    }
    if (isFieldError(link)) return toProblem(invalid({ [link.field]: withoutName(link.message, link.field) }))
    if (isOutage(link)) return { problem: { statusCode: 503, ...plain[503]! }, headers: { 'Retry-After': '2' } }
  }
  const { statusCode } = loose(error)
  const known = typeof statusCode === 'number' ? plain[statusCode] : undefined
  if (known && typeof statusCode === 'number') return { problem: { statusCode, ...known }, headers: {} }
  if (typeof statusCode === 'number' && statusCode >= 400 && statusCode < 500) {
    return { problem: { statusCode, code: 'badRequest', message: 'The request cannot be answered' }, headers: {} }
  }
  return { problem: { statusCode: 500, code: 'internal', message: 'Something went wrong on our side' }, headers: {} }
}

/** Writes down what the client is not told; a refusal of our own, such as "no fit yet", has told all there is. */
export function logFailure(error: unknown, problem: Problem, request: { id: string, method: string, path: string }): void {
  if (problem.statusCode < 500 || chain(error).some(link => link instanceof ApiError)) return
  const root = chain(error).findLast(link => link instanceof Error)
  log.error('a request failed', { ...request, status: problem.statusCode, error: root instanceof Error ? root.stack ?? root.message : String(error) })
}
