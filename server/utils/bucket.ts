export interface BucketRates {
  /** tokens that come back in a minute */
  perMinute: number
  /** tokens that a client who was away has at once */
  burst: number
  /** clients remembered; past it the one seen longest ago is forgotten */
  mostClients: number
}

export type Taken = { allowed: true } | { allowed: false, retryAfterS: number }

interface Bucket { tokens: number, atMs: number }

/** Token buckets in memory, one a client. Bounded: a forgotten client starts with a full bucket. */
export class Buckets {
  private readonly buckets = new Map<string, Bucket>()

  constructor(private readonly rates: BucketRates) {}

  get size(): number {
    return this.buckets.size
  }

  /** Takes one token, or says in how many seconds there will be one. Time is the caller's, in ms, and never runs back. */
  take(client: string, nowMs: number): Taken {
    const { perMinute, burst, mostClients } = this.rates
    const last = this.buckets.get(client)
    const tokens = last ? Math.min(burst, last.tokens + Math.max(0, nowMs - last.atMs) * perMinute / 60_000) : burst
    const allowed = tokens >= 1
    // Set anew, so that the map's order is the order of last use.
    this.buckets.delete(client)
    this.buckets.set(client, { tokens: allowed ? tokens - 1 : tokens, atMs: nowMs })
    if (this.buckets.size > mostClients) this.forgetOldest()
    return allowed ? { allowed } : { allowed, retryAfterS: Math.max(1, Math.ceil((1 - tokens) * 60 / perMinute)) }
  }

  private forgetOldest(): void {
    const [oldest] = this.buckets.keys()
    if (oldest !== undefined) this.buckets.delete(oldest)
  }
}
