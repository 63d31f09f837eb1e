import type { ReadPull } from '#shared/types/reading'

/** Pulls made back to back: the anchor as sold on one side, the modified one on the other. */
export interface Pair { name: string, seabed: ReadPull['seabed'], design: string, designName: string, massKg: number, modification: { slug: string, name: string }, plain: ReadPull[], modified: ReadPull[] }

/** The pairs of a trial in the order of their first pull; a name that stands on one side only is no pair. */
export function pairsOf(pulls: readonly ReadPull[]): Pair[] {
  const groups = new Map<string, ReadPull[]>()
  for (const pull of pulls) if (pull.pair !== null && pull.supersededBy === null) groups.set(pull.pair, [...groups.get(pull.pair) ?? [], pull])
  return [...groups].flatMap(([name, group]) => {
    const modified = group.filter(({ modification }) => modification !== null)
    const plain = group.filter(({ modification }) => modification === null)
    const [first] = modified
    if (!first?.modification || plain.length === 0) return []
    return [{ name, seabed: first.seabed, design: first.design, designName: first.name, massKg: first.massKg, modification: first.modification, plain, modified }]
  })
}
