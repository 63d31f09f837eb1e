import type { HoldingInterval, PullTick } from '#shared/types/reading'
import type { StripRow } from '~/utils/chart/types'
import { stripOf } from '~/utils/ranking'

/** A design on a seabed as a chart's row: loads in the unit that the reader sees. */
export function stripRow(row: { id: string, label: string, note?: string, pattern?: string, dashed?: boolean, n: number, holdingN: HoldingInterval, ticks: readonly PullTick[] }, unitN: number): StripRow {
  const { holdingN, ticks, ...words } = row
  const strip = stripOf({ holdingN, upliftFactor: 1 } as Parameters<typeof stripOf>[0])
  const { median, low50, high50, low90, high90 } = strip ?? { ...holdingN, low50: holdingN.median, high50: holdingN.median }
  return {
    ...words,
    median: median / unitN, low50: low50 / unitN, high50: high50 / unitN, low90: low90 / unitN, high90: high90 / unitN,
    pulls: ticks.map(({ loadN, atLimit }) => ({ value: loadN / unitN, atLimit })),
  }
}

/** Columns of the table beneath such a chart. */
export const stripColumns = (first: string, unit: string) => [
  { key: 'label', label: first },
  { key: 'median', label: 'Median', unit, align: 'right' as const },
  { key: 'low90', label: '90 % from', unit, align: 'right' as const },
  { key: 'high90', label: 'to', unit, align: 'right' as const },
  { key: 'pulls', label: 'Pulls', align: 'right' as const },
  { key: 'days', label: 'Days', align: 'right' as const },
  { key: 'atLimit', label: 'At the limit', align: 'right' as const },
]

/** The number of kept digits that a load bears, as a number for the table and its file. */
export const rounded = (value: number): number => Number(value.toPrecision(3))
