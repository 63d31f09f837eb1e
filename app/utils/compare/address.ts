import type { AnchorWanted } from '#shared/types/comparison'
import type { UnitSystem } from '#shared/units/systems'
import { readQuantity } from '~/utils/plan/quantity'
import type { Query } from '~/utils/plan/typed'

/** Anchors asked for by an address, and what of it was left out, in words. */
export interface WantedAnchors { anchors: AnchorWanted[], notes: string[] }

export const mostAnchors = 4
const [leastKg, mostKg] = [0.5, 2000]
const slugForm = /^[a-z0-9]+(?:-[a-z0-9]+)*$/

const all = (query: Query, key: string): string[] => [query[key] ?? []].flat().map(text => (text ?? '').trim())
const shown = (text: string) => `“${text.slice(0, 40)}”`

/** The mass of an entry: after its colon in kg, else in the field beside it as a reader types it; undefined for none, null where it cannot be read. */
function massOf(own: string | undefined, beside: string | undefined, system: UnitSystem): number | undefined | null {
  const text = own ?? beside ?? ''
  const read = readQuantity(text.slice(0, 40), 'mass', own === undefined ? system : 'metric', leastKg, mostKg)
  if (read.state === 'blank') return undefined
  return read.state === 'read' ? read.value : null
}

/**
 * Reads the anchors of an address: `d=slug:massKg`, two to four times; a form writes `d=slug` and its mass beside it in `m`.
 * What cannot be read, an unknown design, the same anchor twice and whatever is past the fourth is left out and named.
 *
 * @param known slugs of the designs there are; null while that is not known, when any name is taken
 * @param system units that a bare number in `m` is read in
 */
export function readAnchors(query: Query, known: ReadonlySet<string> | null, system: UnitSystem): WantedAnchors {
  const masses = all(query, 'm')
  const anchors: AnchorWanted[] = []
  const notes: string[] = []
  all(query, 'd').forEach((entry, i) => {
    if (entry === '') return
    const [slug = '', own] = entry.split(/:(.*)/s)
    if (!slugForm.test(slug) || slug.length > 80 || (known && !known.has(slug))) {
      notes.push(`There is no design ${shown(slug)}: it was left out.`)
      return
    }
    const massKg = massOf(own, masses[i], system)
    if (massKg === null) notes.push(`The mass ${shown(own ?? masses[i] ?? '')} cannot be read: a mass between 0.5 and 2000 kg is wanted, so the common one was taken.`)
    const anchor = massKg === undefined || massKg === null ? { design: slug } : { design: slug, massKg }
    if (anchors.some(other => other.design === anchor.design && other.massKg === anchor.massKg)) notes.push(`${shown(entry)} stands twice: once is enough.`)
    else if (anchors.length === mostAnchors) notes.push(`At most four anchors are compared: ${shown(entry)} was left out.`)
    else anchors.push(anchor)
  })
  return { anchors, notes }
}

/** The address of a comparison: `d=slug:massKg` an anchor, with a plan's words where there is one. */
export function comparisonQuery(anchors: readonly AnchorWanted[], plan: Record<string, string | string[]> = {}): Record<string, string | string[]> {
  return { d: anchors.map(({ design, massKg }) => massKg === undefined ? design : `${design}:${Number(massKg.toFixed(2))}`), ...plan }
}
