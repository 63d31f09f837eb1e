import type { RuleTableEntry } from '#shared/types/ranking'
import { waterlineRatio } from '#shared/load/boat'
import { within } from '#shared/load/within'

/** Main anchor, kg, for mean lengths of 6, 7 ... 24 m. */
const anchorsKg: readonly number[] = [8, 9, 10, 11, 13, 15, 18, 21, 24, 27, 30, 34, 38, 42, 47, 52, 57, 62, 68]
const FIRST_M = 6

function chainMm(rowM: number): number {
  if (rowM <= 6) return 6
  if (rowM <= 12) return 8
  return rowM <= 18 ? 10 : 12
}

/**
 * Main anchor and chain that the rule table asks for. Source: UK MCA small-vessel code, table 20.1 (anchors of high holding power, short-link
 * chain). Mean length (LOA + LWL)/2 between two rows takes the next longer one.
 *
 * @param lengthM length overall, m, 1 to 150
 * @param waterlineLengthM waterline length, m, 0.5 to 150; 0.88 of the length overall where it is not given (ours)
 * @returns the row; anchorKg, chainMm and rowM null above 24 m, with a note; below 6 m the first row with a note
 * @throws RangeError outside those ranges
 */
export function ruleTable(lengthM: number, waterlineLengthM?: number): RuleTableEntry {
  within('boat.lengthM', lengthM, 1, 150)
  const waterlineM = waterlineLengthM === undefined ? waterlineRatio * lengthM : within('boat.waterline.lengthM', waterlineLengthM, 0.5, 150)
  const meanLengthM = (lengthM + waterlineM) / 2
  const entry = { table: 'UK small-vessel code, table 20.1', source: 'UK MCA small-vessel code, table 20.1: main anchor of high holding power', meanLengthM }
  const rowM = Math.max(FIRST_M, Math.ceil(meanLengthM - 1e-9))
  const anchorKg = anchorsKg[rowM - FIRST_M]
  if (anchorKg === undefined) return { ...entry, rowM: null, anchorKg: null, chainMm: null, note: 'Outside the table: it ends at a mean length of 24 m.' }
  const found = { ...entry, rowM, anchorKg, chainMm: chainMm(rowM) }
  return meanLengthM < FIRST_M - 1e-9 ? { ...found, note: 'The table begins at a mean length of 6 m: its first row is shown.' } : found
}
