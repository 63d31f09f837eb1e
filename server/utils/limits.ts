import type { H3Event } from 'h3'
import { clientOf, isInternal } from './address'
import { Buckets } from './bucket'
import { ApiError } from './errors'

type Environment = Record<string, string | undefined>

export interface Limits { trustedProxies: number, perMinute: number, burst: number }

function whole(env: Environment, name: string, fallback: number, minimum: number, maximum: number): number {
  const text = env[name]
  if (text === undefined || text === '') return fallback
  const value = Number(text)
  if (Number.isInteger(value) && value >= minimum && value <= maximum) return value
  throw new Error(`${name} must be a whole number from ${minimum} to ${maximum}, not "${text}"`)
}

/**
 * How much one address may ask. KEDGEWISE_REQUESTS_PER_MINUTE (600) tokens come back in a minute, KEDGEWISE_REQUESTS_BURST (60) may be
 * spent at once; KEDGEWISE_TRUSTED_PROXIES (0) says how many proxies of our own stand in front.
 *
 * @throws Error naming the variable that is not a whole number in its range
 */
export function readLimits(env: Environment): Limits {
  return {
    trustedProxies: whole(env, 'KEDGEWISE_TRUSTED_PROXIES', 0, 0, 10),
    perMinute: whole(env, 'KEDGEWISE_REQUESTS_PER_MINUTE', 600, 1, 10_000_000),
    burst: whole(env, 'KEDGEWISE_REQUESTS_BURST', 60, 1, 10_000_000),
  }
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
