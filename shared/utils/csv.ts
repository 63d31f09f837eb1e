/** Tables as comma-separated text by RFC 4180: lines end in CR LF, the last one too; UTF-8 without a byte-order mark. */

/** What may stand in a cell; null is empty. */
export type Cell = string | number | boolean | null

const needsQuotes = /[",\r\n]|^\s|\s$/

/**
 * A cell as text. Numbers in the shortest form that reads back as the same number (ECMAScript's), -0 as 0; a text is quoted where it must be.
 *
 * @throws RangeError for a number that is not finite
 */
export function csvCell(value: Cell): string {
  if (value === null) return ''
  if (typeof value === 'boolean') return value ? 'true' : 'false'
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) throw new RangeError(`a number of a table must be finite, got ${value}`)
    return String(value === 0 ? 0 : value)
  }
  return needsQuotes.test(value) ? `"${value.replaceAll('"', '""')}"` : value
}

/** A line of its cells with its end; a lone empty cell is quoted, so that its line is not blank. */
export function csvLine(cells: readonly Cell[]): string {
  const line = cells.map(csvCell).join(',')
  return `${line === '' ? '""' : line}\r\n`
}

/** A whole table, its header first. */
export function writeCsv(header: readonly string[], rows: readonly (readonly Cell[])[]): string {
  return [header, ...rows].map(csvLine).join('')
}

// One cell with what ends it: a quoted text, or one without quotes.
const cellPattern = /(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r?\n|$)/y

/**
 * The cells of a table's text, line by line. Lines may end in CR LF or LF; every line must have as many cells as the first.
 *
 * @throws RangeError naming the line where the text is no table
 */
export function readCsv(text: string): string[][] {
  const rows: string[][] = []
  let row: string[] = []
  cellPattern.lastIndex = 0
  while (cellPattern.lastIndex < text.length || row.length > 0) {
    const found = cellPattern.exec(text)
    if (!found) throw new RangeError(`line ${rows.length + 1} of the table must have its quotes in pairs`)
    const [, quoted, plain = '', end] = found
    row.push(quoted === undefined ? plain : quoted.replaceAll('""', '"'))
    if (end === ',') continue
    if (rows[0] && row.length !== rows[0].length) throw new RangeError(`line ${rows.length + 1} of the table must have ${rows[0].length} cells, got ${row.length}`)
    rows.push(row)
    row = []
  }
  return rows
}

/** The rows of a table under their header's names. @throws RangeError as readCsv */
export function readRecords(text: string): Record<string, string>[] {
  const [header = [], ...rows] = readCsv(text)
  return rows.map(cells => Object.fromEntries(header.map((name, i) => [name, cells[i] ?? ''])))
}
