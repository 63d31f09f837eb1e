/** One row: length overall (ft), greatest beam of a sailing and of a power boat (ft), design loads (lbf). */
export interface TableRow {
  loaFt: number
  beamSailFt: number
  beamPowerFt: number
  mooringLbf: number
  storm42knLbf: number
  working30knLbf: number
  lunch15knLbf: number
}

function row(
  loaFt: number, beamSailFt: number, beamPowerFt: number,
  mooringLbf: number, storm42knLbf: number, working30knLbf: number, lunch15knLbf: number,
): TableRow {
  return { loaFt, beamSailFt, beamPowerFt, mooringLbf, storm42knLbf, working30knLbf, lunch15knLbf }
}

/** Design horizontal loads in the manner of ABYC H-40 table 1, cited from memory: check the current edition. */
export const tableRows: readonly TableRow[] = [
  row(10, 4, 5, 480, 320, 160, 40),
  row(15, 5, 6, 750, 500, 250, 60),
  row(20, 7, 8, 1080, 720, 360, 90),
  row(25, 8, 9, 1470, 980, 490, 125),
  row(30, 9, 11, 2100, 1400, 700, 175),
  row(35, 10, 13, 2700, 1800, 900, 225),
  row(40, 11, 14, 3600, 2400, 1200, 300),
  row(50, 13, 16, 4800, 3200, 1600, 400),
  row(60, 15, 18, 6000, 4000, 2000, 500),
]
