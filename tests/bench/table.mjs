/** Prints rows of equal keys as an aligned table. */
export function printTable(title, rows) {
  process.stdout.write(`\n${title}\n`)
  if (!rows.length) return
  const names = Object.keys(rows[0])
  const cells = [names, ...rows.map(row => names.map(name => String(row[name])))]
  const widths = names.map((_, column) => Math.max(...cells.map(row => row[column].length)))
  for (const row of cells) process.stdout.write(`  ${row.map((cell, column) => cell.padEnd(widths[column])).join('  ').trimEnd()}\n`)
}

export const median = values => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]
