/** Where on the page a caution belongs: beside the number it is about. */
export type Place = 'ranking' | 'strength' | 'table' | 'rode'

const places: readonly [Place, RegExp][] = [
  ['strength', /^(The windlass is not|Holding is not strength)/],
  ['table', /^Standards quoted from memory/],
  ['rode', /^(This rode has nothing|Shallow water needs|The shank is lifted)/],
]

/** The place of a caution; whatever is about holding stands with the ranking. */
export const placeOf = (caution: string): Place => places.find(([, pattern]) => pattern.test(caution))?.[0] ?? 'ranking'

/** Cautions of one place, each once. */
export const cautionsAt = (cautions: readonly string[], place: Place): string[] =>
  [...new Set(cautions)].filter(caution => placeOf(caution) === place)
