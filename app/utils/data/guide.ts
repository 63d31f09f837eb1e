/** The API's description (OpenAPI 3.1) as a page prints it: routes with their fields, one a row. */

interface Schema {
  $ref?: string
  type?: string
  description?: string
  properties?: Record<string, Schema>
  required?: string[]
  items?: Schema
  prefixItems?: Schema[]
  anyOf?: Schema[]
  enum?: unknown[]
  const?: unknown
  minimum?: number
  maximum?: number
  minLength?: number
  maxLength?: number
  minItems?: number
  maxItems?: number
}

interface Media { schema?: Schema, example?: unknown }
interface Parameter { name: string, in: 'path' | 'query', required: boolean, description?: string, schema: Schema, example?: string | number }
interface Response { description: string, content?: Record<string, Media> }
interface Described { operationId: string, summary: string, parameters?: Parameter[], requestBody?: { content: Record<string, Media> }, responses: Record<string, Response> }

/** What of an OpenAPI document the page reads. */
export interface ApiDocument { paths: Record<string, Record<string, Described>>, components: { schemas: Record<string, Schema> } }

/** One field: its place, such as boat.lengthM or pulls[].heldN; what it may be; what it means; `asIn`: where its own fields were told before. */
export interface GuideField { name: string, kind: string, meaning: string, needed: boolean, asIn?: Told }

/** A route, by its id and address, and the field there. */
export interface Told { id: string, path: string, field: string }

export interface GuideRoute {
  id: string
  method: string
  path: string
  summary: string
  address: GuideField[]
  sent: GuideField[]
  status: string
  answered: GuideField[]
  files: string[]
  refusals: { status: string, meaning: string }[]
  example: string
}

/** An object with as many fields as this is told once, and pointed to afterwards. */
const worthPointing = 4

const spaced = (value: number) => Number.isInteger(value) ? String(value).replace(/\B(?=(\d{3})+$)/g, '\u00A0') : String(value)

function range({ minimum, maximum, minLength, maxLength, minItems, maxItems }: Schema): string {
  const [low, high] = [minimum ?? minLength ?? minItems, maximum ?? maxLength ?? maxItems]
  const what = maxLength === undefined ? '' : ' characters'
  // A whole number without a stated end is given the ends of what a program can count: they say nothing.
  const stated = (value: number | undefined) => value !== undefined && Math.abs(value) < Number.MAX_SAFE_INTEGER ? value : undefined
  const [from, to] = [stated(low), stated(high)]
  if (from !== undefined && to !== undefined) return ` ${spaced(from)} to ${spaced(to)}${what}`
  if (from !== undefined) return ` from ${spaced(from)}`
  return to === undefined ? '' : ` to ${spaced(to)}${what}`
}

const kinds: Readonly<Record<string, string>> = { number: 'number', integer: 'whole number', string: 'text', boolean: 'true or false', object: 'object', array: 'list', null: 'null' }

const isNull = ({ type }: Schema) => type === 'null'

/** What a value may be, in a few words. */
export function kindOf(schema: Schema): string {
  if (schema.anyOf) return [...new Set(schema.anyOf.map(kindOf))].join(' or ')
  if (schema.enum) return schema.enum.map(String).join(' · ')
  if (schema.const !== undefined) return String(schema.const)
  return `${kinds[schema.type ?? 'object'] ?? schema.type}${range(schema)}`
}

/** The one schema that is not null, where there is one. */
const core = (schema: Schema): Schema => {
  const [only, ...more] = (schema.anyOf ?? []).filter(part => !isNull(part))
  return only && more.length === 0 ? only : schema
}

/** The object that a field holds, alone or in a list; null where it holds none, or one of several. */
function objectOf(schema: Schema): Schema | null {
  const inner = core(schema)
  if (inner.items) return objectOf(inner.items)
  return inner.properties ? inner : null
}

/** What has been told so far, by the object's own schema; and the route that is being told. */
interface Telling { document: ApiDocument, told: Map<string, Told>, route: { id: string, path: string } }

function pointer(part: Schema, name: string, { told, route }: Telling): Told | undefined {
  const inner = objectOf(part)
  if (!inner || Object.keys(inner.properties ?? {}).length < worthPointing) return undefined
  const key = JSON.stringify(inner.properties)
  const before = told.get(key)
  if (!before) told.set(key, { ...route, field: name })
  return before
}

/** Every field below a schema, row by row, those of an object after the object itself. */
export function fieldsOf(schema: Schema, telling: Telling, place = ''): GuideField[] {
  const inner = core(schema)
  if (inner.$ref) return fieldsOf(telling.document.components.schemas[inner.$ref.replace('#/components/schemas/', '')] ?? {}, telling, place)
  if (inner.items) return fieldsOf(inner.items, telling, `${place}[]`)
  if (inner.anyOf) return inner.anyOf.flatMap(part => fieldsOf(part, telling, place))
  return Object.entries(inner.properties ?? {}).flatMap(([key, part]): GuideField[] => {
    const name = place === '' ? key : `${place}.${key}`
    const asIn = pointer(part, name, telling)
    const field = { name, kind: kindOf(part), meaning: part.description ?? core(part).description ?? '', needed: inner.required?.includes(key) ?? false, ...(asIn && { asIn }) }
    return asIn ? [field] : [field, ...fieldsOf(part, telling, name)]
  })
}

/** JSON as a person would write it: what fits on a line of 76 stands on one. */
export function shortJson(value: unknown, indent = ''): string {
  const flat = JSON.stringify(value, null, 1).replace(/\n\s*/g, ' ')
  if (typeof value !== 'object' || value === null || indent.length + flat.length <= 76) return flat
  const inner = `${indent}  `
  const parts = Array.isArray(value)
    ? value.map(part => inner + shortJson(part, inner))
    : Object.entries(value).map(([key, part]) => `${inner}${JSON.stringify(key)}: ${shortJson(part, inner)}`)
  const [open, close] = Array.isArray(value) ? '[]' : '{}'
  return `${open}\n${parts.join(',\n')}\n${indent}${close}`
}

function exampleOf(method: string, path: string, { parameters = [], requestBody }: Described): string {
  const given = parameters.filter(({ example }) => example !== undefined)
  const filled = given.filter(one => one.in === 'path').reduce((text, { name, example }) => text.replace(`{${name}}`, String(example)), path)
  const query = given.filter(one => one.in === 'query').map(({ name, example }) => `${name}=${encodeURIComponent(String(example))}`).join('&')
  const line = `${method} ${filled}${query && `?${query}`}`
  const body = requestBody?.content['application/json']?.example
  return body === undefined ? line : `${line}\nContent-Type: application/json\n\n${shortJson(body)}`
}

function routeOf(path: string, method: string, described: Described, told: Map<string, Told>, document: ApiDocument): GuideRoute {
  const { operationId, summary, parameters = [], requestBody, responses } = described
  const [[status, good] = ['200', { description: '' }], ...rest] = Object.entries<Response>(responses)
  const schemaOf = (content?: Record<string, Media>) => content?.['application/json']?.schema ?? {}
  const telling = { document, told, route: { id: operationId, path } }
  const media = Object.keys(good.content ?? {})
  return {
    id: operationId, method, path, summary, status,
    address: parameters.map(({ name, description = '', required, schema }) => ({ name, kind: kindOf(schema), meaning: description, needed: required })),
    sent: requestBody ? fieldsOf(schemaOf(requestBody.content), telling) : [],
    answered: media.length > 1 ? [] : fieldsOf(schemaOf(good.content), telling),
    files: media.length > 1 ? media : [],
    refusals: rest.map(([code, { description }]) => ({ status: code, meaning: description })),
    example: exampleOf(method, path, described),
  }
}

/** Every route of the description, in its order, and the fields of the one error shape. */
export function guideOf(document: ApiDocument): { routes: GuideRoute[], problem: GuideField[] } {
  const told = new Map<string, Told>()
  const routes = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, described]) => routeOf(path, method.toUpperCase(), described, told, document)))
  return { routes, problem: fieldsOf(document.components.schemas.Problem ?? {}, { document, told, route: { id: 'errors', path: '' } }) }
}
