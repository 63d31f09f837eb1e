import type { IncomingMessage } from 'node:http'
import { getRequestHeader, setResponseHeader, type H3Event } from 'h3'
import type * as z from 'zod/mini'
import { isInternal } from './address'
import { ApiError } from './errors'
import { validate } from './validate'

export const kilobyte = 1000
/** What a request to a calculation may weigh. */
export const bodyLimitBytes = 64 * kilobyte
/** A body must have arrived by then. */
export const bodyTimeMs = 10_000
/** What is too much is still listened to for so long and so much, unread, so that the client hears the answer. */
const lingerMs = 1000
const lingerBytes = 8_000_000

const tooLarge = (limitBytes: number) =>
  new ApiError(413, 'tooLarge', `The body must be at most ${limitBytes / kilobyte} kB`)

type Outcome = { bytes: Buffer } | { refused: 'tooLarge' | 'tooSlow' | 'broken' }

/** Collects a body, counting what arrives, whatever its headers say; past the limit nothing more is kept. */
function collect(request: IncomingMessage, limitBytes: number, timeMs: number): Promise<Outcome> {
  return new Promise((resolve) => {
    let kept: Buffer[] = []
    let received = 0
    let timer = setTimeout(() => settle({ refused: 'tooSlow' }), timeMs)
    const settle = (outcome: Outcome) => {
      clearTimeout(timer)
      request.off('data', take).off('end', done).off('error', broken).off('close', broken)
      resolve(outcome)
    }
    const refuse = () => settle({ refused: 'tooLarge' })
    const linger = () => {
      kept = []
      clearTimeout(timer)
      timer = setTimeout(refuse, lingerMs)
    }
    const take = (chunk: Buffer) => {
      const within = received <= limitBytes
      received += chunk.length
      if (received <= limitBytes) kept.push(chunk)
      else if (within) linger()
      if (received > limitBytes + lingerBytes) refuse()
    }
    const done = () => settle(received > limitBytes ? { refused: 'tooLarge' } : { bytes: Buffer.concat(kept) })
    const broken = () => settle({ refused: 'broken' })
    request.on('data', take).on('end', done).on('error', broken).on('close', broken)
  })
}

async function receive(event: H3Event, limitBytes: number, timeMs: number): Promise<Buffer> {
  // A call from our own rendering has its body whole and no socket to read it from.
  const given = isInternal(event) ? (event.node.req as IncomingMessage & { body?: unknown }).body : undefined
  if (typeof given === 'string' || given instanceof Uint8Array) {
    const bytes = Buffer.from(given)
    if (bytes.length > limitBytes) throw tooLarge(limitBytes)
    return bytes
  }
  if (isInternal(event)) return Buffer.alloc(0)
  const outcome = await collect(event.node.req, limitBytes, timeMs)
  if ('bytes' in outcome) return outcome.bytes
  if (!event.node.req.complete) setResponseHeader(event, 'Connection', 'close')
  if (outcome.refused === 'tooLarge') throw tooLarge(limitBytes)
  if (outcome.refused === 'tooSlow') throw new ApiError(408, 'tooSlow', `The body did not arrive within ${timeMs / 1000} s`)
  throw new ApiError(400, 'badRequest', 'The body broke off')
}

function checkType(event: H3Event): void {
  const type = getRequestHeader(event, 'content-type')
  const encoding = getRequestHeader(event, 'content-encoding')
  const isJson = type === undefined || /^application\/(?:[\w.+-]+\+)?json\s*(?:;\s*charset="?utf-8"?\s*)?$/i.test(type)
  if (!isJson) throw new ApiError(415, 'unsupportedType', 'Send JSON in UTF-8, with Content-Type: application/json')
  if (encoding !== undefined && encoding.toLowerCase() !== 'identity') throw new ApiError(415, 'unsupportedType', 'Send the body uncompressed')
}

function parse(bytes: Buffer): unknown {
  let text: string
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  }
  catch {
    throw new ApiError(400, 'notJson', 'The body is not UTF-8')
  }
  if (text.trim() === '') throw new ApiError(400, 'emptyBody', 'The body is empty: send a JSON object')
  try {
    return JSON.parse(text)
  }
  catch {
    throw new ApiError(400, 'notJson', 'The body is not JSON')
  }
}

/**
 * Reads a request's JSON body and checks it.
 *
 * @param limits bytes that may be received, and the time for it
 * @throws ApiError 400 empty, broken off or not JSON; 408 too slow; 413 too large; 415 another type or compressed; 422 see validate
 */
export async function readRequest<Schema extends z.ZodMiniType>(
  event: H3Event, schema: Schema, limits: { bytes?: number, timeMs?: number } = {},
): Promise<z.output<Schema>> {
  checkType(event)
  return validate(schema, parse(await receive(event, limits.bytes ?? bodyLimitBytes, limits.timeMs ?? bodyTimeMs)))
}
