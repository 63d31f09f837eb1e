import type { SoilKind } from '#shared/types/words'

/**
 * The marks a drawing combines to show a seabed without colour, after the lithology patterns of the open FGDC
 * Digital Cartographic Standard for Geologic Map Symbolization: stipple for sand, dashes for mud and clay, open circles for gravel
 * and cobble, tufts for weed, hatch for rock.
 */
export const patternKinds = ['stipple', 'dashes', 'circles', 'tufts', 'hatch'] as const
export type PatternKind = (typeof patternKinds)[number]

/** What one seabed is. */
export interface SeabedFacts {
  /** in words, lower case */
  name: string
  soil: SoilKind
  /** whether holding figures exist for it */
  numbered: boolean
  /** one plain paragraph */
  description: string
  /** how a chart after INT 1 section J would write it */
  notation: string
  /** marks of its pattern, what lies on top first; the same mark twice is drawn denser; no two seabeds alike */
  patterns: readonly PatternKind[]
  cautions: readonly string[]
}
