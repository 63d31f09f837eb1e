import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import type { PullRecord } from '#shared/types/holding'
import { readPulls, readTable } from './pullsCsv'

const read = (name: string): string => readFileSync(fileURLToPath(new URL(name, import.meta.url)), 'utf8')

/** Pulls of one of the data files beside this one. */
export function pullsOf(name: string): PullRecord[] {
  return readPulls(read(name))
}

/** Rows of one of the tables that the R scripts wrote. */
export function tableOf(name: string): Record<string, string>[] {
  return readTable(read(name))
}

/** Root mean square of numbers. */
export function rms(values: readonly number[]): number {
  return Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length)
}
