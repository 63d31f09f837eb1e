/** A number read from the start of a text: its value, what follows it, and whether it was written as a fraction. */
export interface ReadNumber { value: number, rest: string, fraction?: string }

/** Splits into groups of three digits, such as 1,200 or 12,345,678; a first group of zeros alone is not one. */
const grouped = /^[1-9]\d{0,2}(?:[,. ]\d{3})+$/

/**
 * Value of digits with points, commas and spaces. How the marks are read:
 * - one comma before exactly three digits parts thousands (`1,200` is 1200), any other single comma is a decimal comma (`11,2`, `0,125`, `1,25`);
 * - one point is always a decimal point (`1.200` is 1.2);
 * - the same mark twice parts thousands (`1,200,000`, `1.200.000`);
 * - with both, the last one is the decimal mark (`1,200.5`, `1.200,5`);
 * - single spaces may part thousands (`1 200`).
 *
 * @returns null when the marks fit none of these
 */
export function decimalValue(text: string): number | null {
  const mark = Math.max(text.lastIndexOf('.'), text.lastIndexOf(','))
  if (mark === -1) return wholeValue(text)
  const char = text.charAt(mark)
  const alone = text.indexOf(char) === mark
  const other = text.includes(char === '.' ? ',' : '.')
  if (!alone) return other ? null : wholeValue(text)
  if (char === ',' && /^[1-9]\d{0,2},\d{3}$/.test(text)) return wholeValue(text)
  const whole = mark === 0 ? 0 : wholeValue(text.slice(0, mark))
  const decimals = text.slice(mark + 1)
  if (whole === null || !/^\d+$/.test(decimals)) return null
  const value = Number(`${whole}.${decimals}`)
  return Number.isFinite(value) ? value : null
}

/** Value of digits, or of digits in groups of three parted by one and the same mark; else null. */
function wholeValue(text: string): number | null {
  if (/^\d+$/.test(text)) return Number(text)
  const marks = new Set(text.replace(/\d/g, ''))
  return marks.size === 1 && grouped.test(text) ? Number(text.replace(/\D/g, '')) : null
}

/**
 * Reads a number, a fraction (`5/16`) or a mixed number (`2 1/2`, `1-1/4`) at the start of a text, with an optional sign.
 *
 * @returns null when the text does not begin with one, or the fraction's lower part is 0
 */
export function readNumber(text: string): ReadNumber | null {
  const sign = /^[-+]/.exec(text)?.[0] ?? ''
  const unsigned = text.slice(sign.length).trimStart()
  const read = readFraction(unsigned) ?? readDecimal(unsigned)
  if (!read || !Number.isFinite(read.value)) return null
  return sign === '-' ? { ...read, value: -read.value } : read
}

function readFraction(text: string): ReadNumber | null {
  const match = /^(?:(\d{1,6})[ -]+)?(\d{1,3})\/(\d{1,3})(?![\d.,/])/.exec(text)
  if (!match) return null
  const [all, whole, top, bottom] = match
  const value = Number(whole ?? 0) + Number(top) / Number(bottom)
  if (!Number.isFinite(value)) return null
  return { value, rest: text.slice(all.length), fraction: whole === undefined ? `${top}/${bottom}` : `${whole} ${top}/${bottom}` }
}

function readDecimal(text: string): ReadNumber | null {
  const [all, digits] = /^(\d{1,3}(?: \d{3})+(?:[.,]\d+)?(?![\d.,])|[\d.,]*\d)(?:[.,](?= |$))?/.exec(text) ?? []
  const value = digits === undefined ? null : decimalValue(digits)
  return all === undefined || value === null ? null : { value, rest: text.slice(all.length) }
}
