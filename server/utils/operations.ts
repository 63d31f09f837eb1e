import type * as z from 'zod/mini'
import { designsAnswer, estimatesAnswer, seabedsAnswer } from '#shared/schemas/answers/catalogue'
import { fitAnswer } from '#shared/schemas/answers/fit'
import { loadAnswer } from '#shared/schemas/answers/load'
import { referenceBoatsAnswer } from '#shared/schemas/answers/method'
import { notationAnswer } from '#shared/schemas/answers/notation'
import { aliveAnswer, readyAnswer } from '#shared/schemas/answers/problem'
import { rankingAnswer } from '#shared/schemas/answers/ranking'
import { rodeAnswer } from '#shared/schemas/answers/rode'
import { designsQuery, estimatesQuery, seabedsQuery } from '#shared/schemas/catalogue'
import { fitRequest } from '#shared/schemas/fit'
import { loadRequest } from '#shared/schemas/load'
import { notationQuery } from '#shared/schemas/notation'
import { rankingRequest } from '#shared/schemas/ranking'
import { rodeRequest } from '#shared/schemas/rode'

/** A route of the API as it is described and allowed: one method, what it takes, what it answers. */
export interface Operation {
  /** as OpenAPI writes it: a part in braces stands for any one name */
  /** a name in braces stands for one part of an address: /api/designs/{slug} */
  path: string
  method: 'GET' | 'POST'
  id: string
  summary: string
  /** what stands in the braces of the path */
  params?: z.ZodMiniObject
  /** the JSON body of a POST */
  request?: z.ZodMiniType
  /** the query of a GET */
  query?: z.ZodMiniObject
  answer?: z.ZodMiniType
  /** 201 where the request makes something; 200 otherwise */
  status?: 200 | 201
  /** refusals besides those of every route */
  refusals: readonly number[]
}

const bodyRefusals = [400, 408, 413, 415, 422, 429]

export const operations: readonly Operation[] = [
  { path: '/api/loads', method: 'POST', id: 'loads', summary: 'What the boat asks of the anchor', request: loadRequest, answer: loadAnswer, refusals: bodyRefusals },
  { path: '/api/rodes', method: 'POST', id: 'rodes', summary: 'How the rode passes the load to the shank', request: rodeRequest, answer: rodeAnswer, refusals: bodyRefusals },
  { path: '/api/rankings', method: 'POST', id: 'rankings', summary: 'Which designs hold for a plan', request: rankingRequest, answer: rankingAnswer, refusals: [...bodyRefusals, 503] },
  { path: '/api/fits', method: 'POST', id: 'fits', summary: 'What would these pulls say? Nothing is stored', request: fitRequest, answer: fitAnswer, refusals: bodyRefusals },
  { path: '/api/chart-notation', method: 'GET', id: 'chartNotation', summary: 'A seabed in chart notation, read', query: notationQuery, answer: notationAnswer, refusals: [422, 429] },
  { path: '/api/designs', method: 'GET', id: 'designs', summary: 'Designs with their sizes', query: designsQuery, answer: designsAnswer, refusals: [422, 429, 503] },
  { path: '/api/seabeds', method: 'GET', id: 'seabeds', summary: 'Seabeds and what they are', query: seabedsQuery, answer: seabedsAnswer, refusals: [422, 429, 503] },
  { path: '/api/estimates', method: 'GET', id: 'estimates', summary: 'What the newest fit says', query: estimatesQuery, answer: estimatesAnswer, refusals: [422, 429, 503] },
  { path: '/api/reference-boats', method: 'GET', id: 'referenceBoats', summary: 'Three reference boats and the smallest sizes that serve', answer: referenceBoatsAnswer, refusals: [429, 503] },
  { path: '/api/openapi.json', method: 'GET', id: 'openapi', summary: 'This description', refusals: [] },
  { path: '/api/health', method: 'GET', id: 'health', summary: 'The server is alive', answer: aliveAnswer, refusals: [] },
  { path: '/api/ready', method: 'GET', id: 'ready', summary: 'The server can answer', answer: readyAnswer, refusals: [503] },
]

const readOnly = ['GET', 'HEAD', 'OPTIONS']

/** True where an address is one of a path's: part by part, a part in braces being any name. */
function answersAt(path: string, address: string): boolean {
  const [wanted, given] = [path.split('/'), address.split('/')]
  return wanted.length === given.length && wanted.every((part, i) => part === given[i] || (part.startsWith('{') && given[i] !== ''))
}

/** The methods of an address: those of its operations; every page can be read; null where the API has nothing there. */
export function allowedMethods(path: string): readonly string[] | null {
  if (!/^\/api(?:\/|$)/.test(path)) return readOnly
  const own = operations.filter(operation => answersAt(operation.path, path)).map(({ method }) => method)
  if (own.length === 0) return null
  return own.includes('GET') ? [...readOnly, ...own.filter(method => method !== 'GET')] : [...own, 'OPTIONS']
}
