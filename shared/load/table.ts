import type { Boat, TableLoad } from '#shared/types/load'
import { FT_M, KN_MS, LBF_N } from '#shared/units/constants'
import { within } from '#shared/load/within'
import { tableRows } from '#shared/load/tableRows'
import type { TableRow } from '#shared/load/tableRows'

/** A value this little above a row still belongs to it, ft. */
const TOLERANCE_FT = 0.05

const multihullNote = 'The table is entered by length alone for a multihull: its beams are those of monohulls.'

/** Index of the first row whose limit is not passed; the number of rows when all of them are. */
function rowIndex(valueM: number, limitFt: (row: TableRow) => number): number {
  const index = tableRows.findIndex(row => valueM / FT_M <= limitFt(row) + TOLERANCE_FT + 1e-9)
  return index === -1 ? tableRows.length : index
}

/** The table load: `table` null where the boat lies outside it, `note` the reason or a remark. */
export interface TableAnswer { table: TableLoad | null, note?: string }

/**
 * Design horizontal load in the manner of ABYC H-40 table 1 (from memory): a conservative envelope for strength, never a chance. Entered by
 * length and by beam, the larger row taken, no interpolation; a multihull by length alone. The 30-kn column times (V/30 kn)^2 at every speed,
 * the speed as entered, mean or gust (our reading). It already holds yaw, gusts and moderate surge.
 *
 * @param boat type, length overall 1 to 150 m, beam 0.3 to 50 m
 * @param speedMs wind speed as entered, m/s, 0 to 150
 * @returns load in N, the row in ft, what decided it, and the load of the next smaller row in N
 * @throws RangeError outside those ranges
 */
export function tableLoad(boat: Pick<Boat, 'type' | 'lengthM' | 'beamM'>, speedMs: number): TableAnswer {
  const scale = LBF_N * (within('speedMs', speedMs, 0, 150) / (30 * KN_MS)) ** 2
  const byLength = rowIndex(within('boat.lengthM', boat.lengthM, 1, 150), row => row.loaFt)
  within('boat.beamM', boat.beamM, 0.3, 50)
  const multihull = boat.type === 'sailMultihull'
  const byBeam = multihull ? 0 : rowIndex(boat.beamM, row => boat.type === 'motor' ? row.beamPowerFt : row.beamSailFt)
  const index = Math.max(byLength, byBeam)
  const row = tableRows[index]
  if (!row) return { table: null, note: outsideNote(boat, byLength) }
  const smaller = tableRows[index - 1]
  const table: TableLoad = {
    loadN: row.working30knLbf * scale,
    rowFt: row.loaFt,
    decidedBy: byBeam > byLength ? 'beam' : 'length',
    neighbourN: smaller ? smaller.working30knLbf * scale : null,
  }
  return multihull ? { table, note: multihullNote } : { table }
}

function outsideNote(boat: Pick<Boat, 'type' | 'lengthM' | 'beamM'>, byLength: number): string {
  const last = tableRows.at(-1)
  if (!last) throw new RangeError('the table must have between 1 and 100 rows, got 0')
  if (byLength === tableRows.length) return `Outside the table: it ends at ${last.loaFt} ft (${(last.loaFt * FT_M).toFixed(1)} m) length overall.`
  const limitFt = boat.type === 'motor' ? last.beamPowerFt : last.beamSailFt
  return `Outside the table: its last row is ${limitFt} ft (${(limitFt * FT_M).toFixed(1)} m) beam.`
}
