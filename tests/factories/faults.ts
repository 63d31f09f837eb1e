/** One way to spoil a request: where, with what, and the field that the refusal must name. */
export interface Fault { name: string, path: (string | number)[], value: unknown, field: string }

/** Stands for "take the key away". */
export const gone = Symbol('gone')

/** A copy of a request with one place of it replaced, added or taken away. `__proto__` becomes a key of its own, as JSON.parse makes it. */
export function spoil<T>(request: T, path: (string | number)[], value: unknown): unknown {
  const copy: unknown = structuredClone(request)
  const holder = path.slice(0, -1).reduce<unknown>((part, key) => (part as Record<string, unknown>)[key], copy) as Record<string, unknown>
  const last = String(path.at(-1))
  if (value === gone) Reflect.deleteProperty(holder, last)
  else Object.defineProperty(holder, last, { value, enumerable: true, configurable: true, writable: true })
  return copy
}

/** Values that no number field may take. */
const notNumbers: [string, unknown][] = [
  ['text', '12'], ['null', null], ['a list', [1]], ['an object', {}], ['true', true], ['not a number', Number.NaN],
  ['Infinity (1e400)', Number.POSITIVE_INFINITY], ['-Infinity', Number.NEGATIVE_INFINITY], ['huge', 1e300], ['negative', -1],
]

type Path = (string | number)[]
const dotted = (path: Path) => path.join('.')

/** Every number of a request, by its path. */
export function numberPaths(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'number') return [path]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, part]) => numberPaths(part, [...path, Array.isArray(value) ? Number(key) : key]))
}

/** Every object of a request, by its path. */
export function objectPaths(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return []
  const inside = Object.entries(value).flatMap(([key, part]) => objectPaths(part, [...path, Array.isArray(value) ? Number(key) : key]))
  return Array.isArray(value) ? inside : [path, ...inside]
}

/** Every number spoilt in every way, and every object given keys it does not know. */
export function faultsOf(request: unknown): Fault[] {
  const numbers = numberPaths(request).flatMap(path => notNumbers
    .filter(([name]) => !(name === 'null' && path.at(-1) === 'movedN'))
    .map(([name, value]) => ({ name: `${dotted(path)}: ${name}`, path, value, field: dotted(path) })))
  const keys = objectPaths(request).flatMap(path => ['unknown', '__proto__', 'constructor', 'toString'].map((key) => {
    const place = [...path, key]
    return { name: `${dotted(place)}: unknown key`, path: place, value: { polluted: true }, field: dotted(place) }
  }))
  return [...numbers, ...keys]
}
