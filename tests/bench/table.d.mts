export function printTable(title: string, rows: Record<string, string | number>[]): void
export function median(values: readonly number[]): number
