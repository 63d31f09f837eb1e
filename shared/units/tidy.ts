/** Fractions that stand as one character, spelled out with a space before them so that `35½` is thirty-five and a half. */
const fractions: Readonly<Record<string, string>> = { '¼': ' 1/4', '½': ' 1/2', '¾': ' 3/4', '⅛': ' 1/8', '⅜': ' 3/8', '⅝': ' 5/8', '⅞': ' 7/8' }

/** One spelling for characters that look alike: primes, quotes, dashes, spaces, raised figures. Two apostrophes are inches. */
export function tidy(text: string): string {
  return text
    .replace(/[¼½¾⅛⅜⅝⅞]/g, character => fractions[character] ?? character)
    .normalize('NFKC')
    .replace(/[‘’‛′ʹʼ`´]/g, '\'')
    .replace(/[“”‟″ʺ]|''/g, '"')
    .replace(/[‐‑‒–−]/g, '-')
    .replace(/⁄/g, '/')
    .replace(/º/g, '°')
    .replace(/\s+/g, ' ')
    .trim()
}
