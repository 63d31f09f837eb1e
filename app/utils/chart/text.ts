/**
 * Breaks a text into lines of at most so many characters, at spaces only; a longer word keeps a line of its own, a figure keeps its unit
 * ("20 kg", "3 %").
 */
export function wrapped(text: string, most: number): string[] {
  const lines: string[] = []
  for (const word of text.replace(/(\d) (?=(?:[a-z]{1,3}|%)(?![a-z]))/gi, '$1\u00A0').split(' ')) {
    const last = lines.at(-1)
    if (last !== undefined && last.length + 1 + word.length <= most) lines[lines.length - 1] = `${last} ${word}`
    else lines.push(word)
  }
  return lines
}

/** A figure and its unit with a space that does not break. */
export const withUnit = (text: string, unit: string): string => unit === '' ? text : `${text}\u00A0${unit}`

/** "1 pull", "12 pulls", "no pulls". */
export const pullsInWords = (n: number): string => n === 0 ? 'no pulls' : n === 1 ? '1 pull' : `${n} pulls`
