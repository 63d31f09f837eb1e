import type { Cell } from '#shared/utils/csv'

/** What Table Schema knows of a field, and the unit in UCUM's spelling ('1' for a bare number). */
export interface Field {
  name: string
  type: 'string' | 'number' | 'integer' | 'boolean' | 'date' | 'datetime'
  description: string
  unit?: string
  constraints?: { required?: true, unique?: true, minimum?: number, maximum?: number, enum?: readonly string[] }
}

export interface Column<Row> extends Field { cell: (row: Row) => Cell }

/** A table of a release: one observation a row. `key`: the columns that name a row; `refers`: where a column's value is another table's. */
export interface Table<Row> {
  name: string
  title: string
  key: readonly string[]
  refers?: readonly (readonly [column: string, table: string, field: string])[]
  columns: readonly Column<Row>[]
}

type More = Pick<Field, 'unit'> & Field['constraints'] & { optional?: true }

/** A column; it must be filled unless it is optional. */
export function column<Row>(name: string, type: Field['type'], description: string, cell: (row: Row) => Cell, more: More = {}): Column<Row> {
  const { unit, optional, ...rest } = more
  const constraints = { ...(!optional && { required: true as const }), ...rest }
  return { name, type, description, ...(unit && { unit }), ...(Object.keys(constraints).length > 0 && { constraints }), cell }
}

/** A table with its rows, its row type forgotten. */
export interface FilledTable { name: string, title: string, key: readonly string[], refers: readonly (readonly [string, string, string])[], fields: Field[], rows: Cell[][] }

/** Fills a table in the order of its rows' keys, text by code unit and numbers by size, whatever order they came in. */
export function fill<Row>({ name, title, key, refers = [], columns }: Table<Row>, rows: readonly Row[]): FilledTable {
  const at = key.map(part => columns.findIndex(one => one.name === part))
  const compare = (a: Cell[], b: Cell[]) => {
    for (const i of at) {
      const [x, y] = [a[i] ?? '', b[i] ?? '']
      if (x !== y) return x < y ? -1 : 1
    }
    return 0
  }
  return {
    name, title, key, refers,
    fields: columns.map(({ cell: _cell, ...field }) => field),
    rows: rows.map(row => columns.map(({ cell }) => cell(row))).sort(compare),
  }
}
