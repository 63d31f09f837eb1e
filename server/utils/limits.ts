import type { H3Event } from 'h3'
import { clientOf, isInternal } from './address'
import { Buckets } from './bucket'
import { ApiError } from './errors'

type Environment = Record<string, string | undefined>

export interface Limits { trustedProxies: number, perMinute: number, burst: number }

interface Variable { name: string, fallback: number, minimum: number, maximum: number }

const variables: Record<keyof Limits, Variable> = {
  trustedProxies: { name: 'KEDGEWISE_TRUSTED_PROXIES', fallback: 0, minimum: 0, maximum: 10 },
  perMinute: { name: 'KEDGEWISE_REQUESTS_PER_MINUTE', fallback: 600, minimum: 1, maximum: 10_000_000 },
  burst: { name: 'KEDGEWISE_REQUESTS_BURST', fallback: 60, minimum: 1, maximum: 10_000_000 },
}

/** The variable's value; null where it is not a whole number in its range. */
function valueOf(env: Environment, { name, fallback, minimum, maximum }: Variable): number | null {
  const text = env[name] ?? ''
  if (text === '') return fallback
  const value = /^\d+$/.test(text) ? Number(text) : Number.NaN
  return value >= minimum && value <= maximum ? value : null
}

/** What is wrong with the variables, each named: the server does not start with any. */
export function limitProblems(env: Environment): string[] {
  return Object.values(variables).filter(variable => valueOf(env, variable) === null)
    .map(({ name, minimum, maximum }) => `${name} must be a whole number from ${minimum} to ${maximum}`)
}

/**
 * How much one address may ask: so many requests come back in a minute, so many may be spent at once; and how many proxies of our own
 * stand in front. A variable that is wrong counts as not set; limitProblems keeps a server from starting with one.
 */
export function readLimits(env: Environment): Limits {
  const value = (variable: Variable) => valueOf(env, variable) ?? variable.fallback
  return { trustedProxies: value(variables.trustedProxies), perMinute: value(variables.perMinute), burst: value(variables.burst) }
}

/** Counts requests of an address; calls of our own rendering are free, since the page itself was counted. */
export function createLimiter(limits: Limits, nowMs: () => number = () => performance.now()): (event: H3Event) => void {
  const buckets = new Buckets({ ...limits, mostClients: 50_000 })
  return (event) => {
    if (isInternal(event)) return
    const taken = buckets.take(clientOf(event, limits.trustedProxies), nowMs())
    if (taken.allowed) return
    throw new ApiError(429, 'tooMany', `Too many requests from this address: try again in ${taken.retryAfterS} s`, {
      headers: { 'Retry-After': String(taken.retryAfterS) },
    })
  }
}

let limiter: ((event: H3Event) => void) | null = null

/** Takes one request from the budget of the client's address. @throws ApiError 429 with Retry-After */
export function countRequest(event: H3Event): void {
  limiter ??= createLimiter(readLimits(process.env))
  limiter(event)
}

/** Questions about pulls: one address may ask five at once, and one more every two minutes. */
const questions = { perMinute: 0.5, burst: 5 }
let questionLimiter: ((event: H3Event) => void) | null = null

/** Takes one question from what the client's address may ask. @throws ApiError 429 with Retry-After */
export function countQuestion(event: H3Event): void {
  questionLimiter ??= createLimiter({ ...questions, trustedProxies: readLimits(process.env).trustedProxies })
  questionLimiter(event)
}
