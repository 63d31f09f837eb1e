import * as z from 'zod/mini'
import { problem } from '#shared/schemas/answers/problem'
import { examples } from '../utils/examples'
import { operations, type Operation } from '../utils/operations'

type Json = Record<string, unknown>

const reasons: Readonly<Record<number, string>> = {
  400: 'Empty body, or not JSON',
  404: 'There is no such thing',
  405: 'Method not allowed; see Allow',
  408: 'The body did not arrive in time',
  413: 'Too large: 64 kB, for fits 1.5 MB',
  415: 'Not application/json',
  422: 'Out of range, missing or unknown; every field is named',
  429: 'Too many requests; see Retry-After',
  500: 'Our fault',
  503: 'Not available just now, or no fit yet; see Retry-After',
}

/** JSON Schema of OpenAPI 3.1 of what is sent, or of what is answered; it is the default dialect, so it need not be named. */
function schemaOf(schema: z.ZodMiniType, io: 'input' | 'output'): Json {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { target: 'draft-2020-12', io }) as Json
  return rest
}

const nameOf = (id: string, kind: string) => `${id[0]?.toUpperCase()}${id.slice(1)}${kind}`
const reference = (name: string) => ({ $ref: `#/components/schemas/${name}` })
const json = (schema: Json) => ({ 'application/json': { schema } })

/** What a route that sends files answers with, by the kind of file. */
const files = { 'text/csv': { schema: { type: 'string' } }, 'application/json': { schema: { type: 'object' } }, 'application/x-tar': { schema: { type: 'string', format: 'binary' } } }

function parametersIn(place: 'path' | 'query', shape: z.ZodMiniObject | undefined, id: string): Json[] {
  if (!shape) return []
  const example = examples[id]?.address ?? {}
  const { properties = {}, required = [] } = schemaOf(shape, 'input') as { properties?: Record<string, Json>, required?: string[] }
  return Object.entries(properties).map(([name, { description, ...schema }]) => ({
    name, in: place, required: required.includes(name), description, schema, ...(name in example && { example: example[name] }),
  }))
}

function responses({ id, answer, sendsFiles, status = 200, refusals }: Operation): Json {
  const refused = [...refusals, 405, 500].map(status => [status, { description: reasons[status], content: json(reference('Problem')) }])
  const answered = sendsFiles ? files : answer ? json(reference(nameOf(id, 'Answer'))) : json({ type: 'object' })
  return Object.fromEntries([[status, { description: 'The answer', content: answered }], ...refused])
}

function operationObject(operation: Operation): Json {
  const { id, summary, request, params, query } = operation
  const parameters = [...parametersIn('path', params, id), ...parametersIn('query', query, id)]
  return {
    operationId: id,
    summary,
    ...(parameters.length > 0 && { parameters }),
    ...(request && { requestBody: { required: true, content: { 'application/json': { schema: reference(nameOf(id, 'Request')), example: examples[id]?.body } } } }),
    responses: responses(operation),
  }
}

function components(): Json {
  const named = operations.flatMap(({ id, request, answer }) => [
    ...(request ? [[nameOf(id, 'Request'), schemaOf(request, 'input')] as const] : []),
    ...(answer ? [[nameOf(id, 'Answer'), schemaOf(answer, 'output')] as const] : []),
  ])
  return { ...Object.fromEntries(named), Problem: schemaOf(problem, 'output') }
}

function build(): Json {
  const paths: Record<string, Json> = {}
  for (const operation of operations) {
    paths[operation.path] = { ...paths[operation.path], [operation.method.toLowerCase()]: operationObject(operation) }
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Kedgewise',
      version: '1',
      description: 'Ground tackle chosen on evidence. SI units, names carry the unit. Estimates from short pulls on someone else\'s bottom: not a promise.',
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: '/' }],
    paths,
    components: { schemas: components() },
  }
}

let document: Json | null = null

/** The API described in OpenAPI 3.1, from the schemas that its routes check with. */
export function openapi(): Json {
  document ??= build()
  return document
}
