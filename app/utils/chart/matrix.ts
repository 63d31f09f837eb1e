import { wrapped } from './text'
import type { MatrixColumn, MatrixRow } from './types'

/** A row of the narrow drawing: the cells that have a figure, one a line, then the columns without, in words. */
export interface MatrixBlock { top: number, height: number, filled: readonly number[], missing: readonly string[], firstY: number }

export function matrixBlocks(columns: readonly MatrixColumn[], rows: readonly MatrixRow[], missing: string, most = 44): MatrixBlock[] {
  let top = 0
  return rows.map(({ cells }) => {
    const filled = columns.flatMap((_, index) => cells[index] ? [index] : [])
    const empty = columns.filter((_, index) => !cells[index]).map(column => column.label)
    const words = empty.length === 0 ? [] : wrapped(`${missing}: ${empty.join(', ')}`, most)
    const height = 30 + filled.length * 26 + words.length * 18 + 16
    const block = { top, height, filled, missing: words, firstY: top + 30 }
    top += height
    return block
  })
}

/** A row of the wide drawing, as high as its label needs. */
export interface MatrixLine { row: MatrixRow, label: readonly string[], top: number, height: number, index: number }

export function matrixRows(rows: readonly MatrixRow[], head: number, most: number, missingLines: number): MatrixLine[] {
  let top = head
  return rows.map((row, index) => {
    const label = wrapped(row.label, most)
    const line = { row, label, top, height: Math.max(18 * label.length + 14, row.cells.includes(null) ? 16 * missingLines + 14 : 0, 52), index }
    top += line.height
    return line
  })
}
