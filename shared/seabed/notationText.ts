import type { ChartConstituent } from '#shared/types/chart'
import { nouns, qualifiers } from '#shared/seabed/notationTables'
import type { NotationWord } from '#shared/seabed/notationTables'

function abbreviate(words: readonly NotationWord<number | null>[], word: string): string {
  const found = words.find(other => other.word === word)
  if (found) return found.abbreviation
  throw new RangeError(`word must be one of ${words.map(other => other.word).join(', ')}, got ${word}`)
}

/**
 * Writes layers of constituents as a chart does: the reverse of reading them. Source: IHO INT 1 section J.
 *
 * @param layers from the top down, constituents from the main one on, in the words of the notation
 * @throws RangeError for a word that the notation does not have
 */
export function writeChartNotation(layers: readonly (readonly Pick<ChartConstituent, 'noun' | 'qualifiers'>[])[]): string {
  return layers.map(layer => layer.map(({ noun, qualifiers: said }) =>
    said.map(word => abbreviate(qualifiers, word)).join('') + abbreviate(nouns, noun)).join('.')).join('/')
}

/** Layers in words, such as "fine sand with mud and shells", or "sand over mud"; empty without any. */
export function layersInWords(layers: readonly (readonly ChartConstituent[])[]): string {
  return layers.map(layerInWords).join(' over ')
}

function layerInWords(layer: readonly ChartConstituent[]): string {
  const [main, ...others] = layer.map(({ noun, qualifiers: said }) => [...said, noun].join(' '))
  const last = others.pop()
  if (last === undefined) return main ?? ''
  return `${main} with ${others.length === 0 ? last : `${others.join(', ')} and ${last}`}`
}
