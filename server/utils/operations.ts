import type * as z from 'zod/mini'
import { estimatesAnswer, seabedsAnswer } from '#shared/schemas/answers/catalogue'
import { comparisonAnswer } from '#shared/schemas/answers/comparison'
import { fitAnswer } from '#shared/schemas/answers/fit'
import { loadAnswer } from '#shared/schemas/answers/load'
import { referenceBoatsAnswer } from '#shared/schemas/answers/method'
import { modificationAnswer, modificationsAnswer, modificationWorthAnswer } from '#shared/schemas/answers/modification'
import { notationAnswer } from '#shared/schemas/answers/notation'
import { aliveAnswer, readyAnswer } from '#shared/schemas/answers/problem'
import { rankingAnswer } from '#shared/schemas/answers/ranking'
import { designAnswer, designNamesAnswer, designsAnswer, questionAnswer, seabedAnswer, trialAnswer, trialPullsAnswer, trialsAnswer } from '#shared/schemas/answers/reading'
import { releaseAnswer, releasesAnswer } from '#shared/schemas/answers/release'
import { rodeAnswer } from '#shared/schemas/answers/rode'
import { estimatesQuery, seabedsQuery } from '#shared/schemas/catalogue'
import { comparisonRequest } from '#shared/schemas/comparison'
import { fitRequest } from '#shared/schemas/fit'
import { loadRequest } from '#shared/schemas/load'
import { modificationParams, modificationsQuery, modificationWorthRequest } from '#shared/schemas/modification'
import { notationQuery } from '#shared/schemas/notation'
import { rankingRequest } from '#shared/schemas/ranking'
import { atMassQuery, designsQuery, noQuery, pullParams, questionRequest, slugParams, trialsQuery } from '#shared/schemas/reading'
import { releaseFileParams, releaseParams, releasesQuery } from '#shared/schemas/release'
import { rodeRequest } from '#shared/schemas/rode'

/** A route of the API as it is described and allowed: one method, what it takes, what it answers. */
export interface Operation {
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
  /** answers with a file to be saved */
  sendsFiles?: true
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
  { path: '/api/designs', method: 'GET', id: 'designs', summary: 'Designs with their sizes, fifty a page', query: designsQuery, answer: designsAnswer, refusals: [422, 429, 503] },
  { path: '/api/designs/{slug}', method: 'GET', id: 'design', summary: 'A design with all that was pulled of it', params: slugParams, query: atMassQuery, answer: designAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/design-names', method: 'GET', id: 'designNames', summary: 'Every design\'s name', query: noQuery, answer: designNamesAnswer, refusals: [422, 429, 503] },
  { path: '/api/seabeds', method: 'GET', id: 'seabeds', summary: 'Seabeds and what they are', query: seabedsQuery, answer: seabedsAnswer, refusals: [422, 429, 503] },
  { path: '/api/seabeds/{slug}', method: 'GET', id: 'seabed', summary: 'A seabed and the designs on it', params: slugParams, query: atMassQuery, answer: seabedAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/trials', method: 'GET', id: 'trials', summary: 'Trials, newest first, fifty a page', query: trialsQuery, answer: trialsAnswer, refusals: [422, 429, 503] },
  { path: '/api/trials/{slug}', method: 'GET', id: 'trial', summary: 'A trial, its plain means beside the estimates', params: slugParams, query: noQuery, answer: trialAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/trials/{slug}/pulls', method: 'GET', id: 'trialPulls', summary: 'The pulls of a trial', params: slugParams, query: noQuery, answer: trialPullsAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/pulls/{id}/questions', method: 'POST', id: 'questions', summary: 'Something wrong with this pull? Kept for the reviewers', params: pullParams, request: questionRequest, answer: questionAnswer, status: 201, refusals: [...bodyRefusals, 404, 503] },
  { path: '/api/estimates', method: 'GET', id: 'estimates', summary: 'What the newest fit says', query: estimatesQuery, answer: estimatesAnswer, refusals: [422, 429, 503] },
  { path: '/api/comparisons', method: 'POST', id: 'comparisons', summary: 'Which of two to four anchors holds more', request: comparisonRequest, answer: comparisonAnswer, refusals: [...bodyRefusals, 503] },
  { path: '/api/modifications', method: 'GET', id: 'modifications', summary: 'Modifications and what the pulls say of them', query: modificationsQuery, answer: modificationsAnswer, refusals: [422, 429, 503] },
  { path: '/api/modifications/{slug}', method: 'GET', id: 'modification', summary: 'A modification, the pairs behind it, its worth for a reference plan', params: modificationParams, query: modificationsQuery, answer: modificationAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/modification-worths', method: 'POST', id: 'modificationWorths', summary: 'What a modification is worth for a plan', request: modificationWorthRequest, answer: modificationWorthAnswer, refusals: [...bodyRefusals, 404, 503] },
  { path: '/api/reference-boats', method: 'GET', id: 'referenceBoats', summary: 'Three reference boats and the smallest sizes that serve', answer: referenceBoatsAnswer, refusals: [429, 503] },
  { path: '/api/releases', method: 'GET', id: 'releases', summary: 'Frozen editions of the data, newest first', query: releasesQuery, answer: releasesAnswer, refusals: [422, 429, 503] },
  { path: '/api/releases/{version}', method: 'GET', id: 'release', summary: 'One edition of the data: its files, and what changed', params: releaseParams, answer: releaseAnswer, refusals: [404, 422, 429, 503] },
  { path: '/api/releases/{version}/{file}', method: 'GET', id: 'releaseFile', summary: 'A file of a release, to be saved', params: releaseFileParams, sendsFiles: true, refusals: [404, 422, 429, 503] },
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
