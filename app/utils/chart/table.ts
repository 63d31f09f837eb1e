import type { ChartColumn, ChartTableRow } from './types'

const header = ({ label, unit }: ChartColumn) => unit ? `${label} (${unit})` : label

/** A field as RFC 4180 wants it: quoted where it holds a comma, a quote or a line end. */
const field = (value: string | number | null) => {
  const text = value === null ? '' : String(value)
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text
}

/** The table of numbers as CSV (RFC 4180), one row a line, units in the headers. */
export function tableCsv(columns: readonly ChartColumn[], rows: readonly ChartTableRow[]): string {
  const lines = [columns.map(header), ...rows.map(row => columns.map(({ key }) => row[key] ?? null))]
  return lines.map(line => line.map(field).join(',')).join('\r\n') + '\r\n'
}

export const columnHeader = header
