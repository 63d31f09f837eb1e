import { writeCsv } from '#shared/utils/csv'
import type { ChartColumn, ChartTableRow } from './types'

/** What stands over a column: its name and unit. */
export const columnHeader = ({ label, unit }: ChartColumn) => unit ? `${label} (${unit})` : label

/** The table of numbers as CSV (RFC 4180), one row a line, units in the headers. */
export function tableCsv(columns: readonly ChartColumn[], rows: readonly ChartTableRow[]): string {
  return writeCsv(columns.map(columnHeader), rows.map(row => columns.map(({ key }) => row[key] ?? null)))
}
