import { expect } from 'vitest'

/** Budget of an address in tests that ask a lot. */
export const unlimited = { KEDGEWISE_REQUESTS_PER_MINUTE: '10000000', KEDGEWISE_REQUESTS_BURST: '10000000' }

export interface Answer { status: number, headers: Headers, body: Record<string, unknown> }

export async function answerOf(response: Response): Promise<Answer> {
  return { status: response.status, headers: response.headers, body: await response.json() as Record<string, unknown> }
}

/** Sends JSON; a text or bytes go as they are. */
export async function post(address: string, body: unknown, headers: Record<string, string> = {}): Promise<Answer> {
  const sent = typeof body === 'string' || body instanceof Uint8Array ? body as BodyInit : JSON.stringify(body)
  return answerOf(await fetch(address, { method: 'POST', body: sent, headers: { 'Content-Type': 'application/json', ...headers } }))
}

export const get = async (address: string) => answerOf(await fetch(address))

const keys = ['statusCode', 'code', 'message', 'fields']

/** A refusal has the one error shape, says its status and nothing of the inside. */
export function expectProblem(answer: Answer, status: number): void {
  expect(answer.status, JSON.stringify(answer.body)).toBe(status)
  expect(answer.body.statusCode).toBe(status)
  expect(answer.body.code).toEqual(expect.stringMatching(/^[a-zA-Z]+$/))
  expect(answer.body.message).toEqual(expect.any(String))
  expect(Object.keys(answer.body).filter(key => !keys.includes(key))).toEqual([])
  expect(JSON.stringify(answer.body)).not.toMatch(/zod|invalid_type|unrecognized_keys|select |postgres|node_modules|\.m?[jt]s\b|at \w+ \(/i)
}
