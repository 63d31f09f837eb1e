import type * as z from 'zod/mini'
import { ApiError, invalid } from './errors'

/** A refused request names at most this many fields; the message counts the rest. */
export const mostFields = 50

/** `['boat', 'windage', 2, 'areaM2']` -> `boat.windage.2.areaM2`; the whole request is `request`. */
const dotted = (path: readonly PropertyKey[]) => path.map(String).join('.') || 'request'

/** Every fault of a value by its field; the first fault of a field stands. */
function faults(error: z.core.$ZodError): Map<string, string> {
  const fields = new Map<string, string>()
  const add = (path: readonly PropertyKey[], words: string) => {
    const field = dotted(path)
    if (!fields.has(field)) fields.set(field, words)
  }
  for (const issue of error.issues) {
    if (issue.code === 'unrecognized_keys') issue.keys.forEach(key => add([...issue.path, key], 'is not a known field'))
    else add(issue.path, issue.message)
  }
  return fields
}

/**
 * Checks a request against its schema.
 *
 * @throws ApiError 422 that names every field at fault (the first fifty) with what it must be
 */
export function validate<Schema extends z.ZodMiniType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const fields = faults(result.error)
  throw invalid(Object.fromEntries([...fields].slice(0, mostFields)), fields.size)
}

/**
 * The query of an address as plain texts.
 *
 * @throws ApiError 422 where a key is given twice
 */
export function queryOf(path: string): Record<string, string> {
  const start = path.indexOf('?')
  const entries = [...new URLSearchParams(start < 0 ? '' : path.slice(start + 1))]
  const names = entries.map(([name]) => name)
  const twice = names.find((name, index) => names.indexOf(name) !== index)
  if (twice !== undefined) throw new ApiError(422, 'invalid', `${twice} must be given once`, { fields: { [twice]: 'must be given once' } })
  return Object.fromEntries(entries)
}
