import type { Seabed } from './words'

/** One material a chart names: noun and qualifiers in words, with their codes in S-57 (NATSUR, NATQUA); null where there is none. */
export interface ChartConstituent { noun: string, natsur: number | null, qualifiers: string[], natqua: number[] }

/** A piece of the text that could not be read, and where it begins (0 is the first character). */
export interface ChartUnread { text: string, at: number }

/** What a chart's abbreviation of the seabed says. Layers from the top down, constituents from the main one on. */
export interface ChartNotationAnswer {
  layers: ChartConstituent[][]
  seabed: Seabed | null
  alternatives: Seabed[]
  cautions: string[]
  unread: ChartUnread[]
}
