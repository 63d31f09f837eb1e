import type { ChartConstituent, ChartNotationAnswer, ChartUnread } from '#shared/types/chart'
import { nouns, qualifiers, sandOnly, wordAt } from '#shared/seabed/notationTables'
import type { NotationWord } from '#shared/seabed/notationTables'
import { proposeSeabed } from '#shared/seabed/propose'

interface Reading {
  layers: ChartConstituent[][]
  unread: ChartUnread[]
  /** qualifiers waiting for their noun, with their places */
  waiting: { qualifier: NotationWord<number>, at: number }[]
  /** whether a noun may stand here, and what the last mark was */
  open: boolean
  mark: ChartUnread | null
}

/**
 * Reads a chart's abbreviation of the seabed, such as `fS.M.Sh` (fine sand with mud and shells, main constituent first) or `S/M` (sand over mud).
 * Qualifiers stand before their noun; fine, medium and coarse go with sand only. What cannot be read is named with its place. Source: IHO INT 1
 * section J, S-57 NATSUR and NATQUA; the proposal of one of the product's seabeds is ours.
 *
 * @param text any text; spaces around marks are skipped
 * @returns layers from the top, one proposed seabed or null, other seabeds it may be, cautions, and what was not read
 */
export function readChartNotation(text: string): ChartNotationAnswer {
  const reading: Reading = { layers: [[]], unread: [], waiting: [], open: true, mark: null }
  for (let at = 0; at < text.length;) at += readAt(reading, text, at)
  dropWaiting(reading)
  if (reading.mark) reading.unread.push(reading.mark)
  const layers = reading.layers.filter(layer => layer.length > 0)
  const unread = joinNeighbours(reading.unread)
  return { layers, ...proposeSeabed(layers, unread.length > 0), unread }
}

/** Reads what stands at one place and says how many characters it took. */
function readAt(reading: Reading, text: string, at: number): number {
  const character = text.charAt(at)
  if (/\s/.test(character)) return 1
  if (character === '.' || character === '/') return readMark(reading, character, at)
  const noun = wordAt(nouns, text, at)
  if (noun && reading.open) return readNoun(reading, noun)
  const qualifier = noun ? undefined : wordAt(qualifiers, text, at)
  const taken = reading.waiting.some(({ qualifier: other }) => other === qualifier)
  if (qualifier && reading.open && !taken) {
    reading.waiting.push({ qualifier, at })
    return qualifier.abbreviation.length
  }
  const unread = (noun ?? qualifier)?.abbreviation ?? character
  reading.unread.push({ text: unread, at })
  return unread.length
}

function readMark(reading: Reading, mark: string, at: number): number {
  dropWaiting(reading)
  if (reading.open) {
    reading.unread.push({ text: mark, at })
    return 1
  }
  if (mark === '/') reading.layers.push([])
  reading.open = true
  reading.mark = { text: mark, at }
  return 1
}

function readNoun(reading: Reading, noun: NotationWord<number | null>): number {
  const fits = (qualifier: NotationWord<number>): boolean => noun.word === 'sand' || !sandOnly.has(qualifier.word)
  const said = reading.waiting.filter(({ qualifier }) => fits(qualifier)).map(({ qualifier }) => qualifier)
  reading.waiting = reading.waiting.filter(({ qualifier }) => !fits(qualifier))
  dropWaiting(reading)
  reading.layers.at(-1)?.push({ noun: noun.word, natsur: noun.code, qualifiers: said.map(({ word }) => word), natqua: said.map(({ code }) => code) })
  reading.open = false
  reading.mark = null
  return noun.abbreviation.length
}

/** Qualifiers that found no noun were not read. */
function dropWaiting(reading: Reading): void {
  reading.unread.push(...reading.waiting.map(({ qualifier, at }) => ({ text: qualifier.abbreviation, at })))
  reading.waiting = []
}

/** One piece where several stand side by side. */
function joinNeighbours(pieces: readonly ChartUnread[]): ChartUnread[] {
  const joined: ChartUnread[] = []
  for (const piece of [...pieces].sort((one, other) => one.at - other.at)) {
    const last = joined.at(-1)
    if (last && last.at + last.text.length === piece.at) last.text += piece.text
    else joined.push({ ...piece })
  }
  return joined
}
