/** A word of the notation: its abbreviation, in words, and its S-57 code (null where there is none). */
export interface NotationWord<Code extends number | null> { abbreviation: string, word: string, code: Code }

function word<Code extends number | null>(abbreviation: string, text: string, code: Code): NotationWord<Code> {
  return { abbreviation, word: text, code }
}

/** Materials. Source: IHO INT 1 section J; codes of S-57 attribute NATSUR (113). */
export const nouns: readonly NotationWord<number | null>[] = [
  word('S', 'sand', 4), word('M', 'mud', 1), word('Cy', 'clay', 2), word('Si', 'silt', 3), word('St', 'stones', 5), word('G', 'gravel', 6),
  word('P', 'pebbles', 7), word('Cb', 'cobbles', 8), word('R', 'rock', 9), word('Bo', 'boulders', 18), word('Co', 'coral', 14),
  word('Sh', 'shells', 17), word('Wd', 'weed', null), word('Sg', 'seagrass', null),
]

/** What is said of a material. Source: IHO INT 1 section J; codes of S-57 attribute NATQUA (114). */
export const qualifiers: readonly NotationWord<number>[] = [
  word('f', 'fine', 1), word('m', 'medium', 2), word('c', 'coarse', 3), word('bk', 'broken', 4), word('sy', 'sticky', 5), word('so', 'soft', 6),
  word('sf', 'stiff', 7), word('v', 'volcanic', 8), word('ca', 'calcareous', 9), word('h', 'hard', 10),
]

/** Said of sand only. */
export const sandOnly: ReadonlySet<string> = new Set(['fine', 'medium', 'coarse'])

/**
 * The word that stands at a place in a text: the longest abbreviation that fits, upper and lower case apart (`ca` before `c`, `Si` before `S`).
 */
export function wordAt<Code extends number | null>(words: readonly NotationWord<Code>[], text: string, at: number): NotationWord<Code> | undefined {
  const fits = words.filter(({ abbreviation }) => text.startsWith(abbreviation, at))
  return fits.reduce<NotationWord<Code> | undefined>(
    (longest, next) => longest && longest.abbreviation.length >= next.abbreviation.length ? longest : next, undefined)
}
