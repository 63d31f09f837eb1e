import type { DemandPoint } from '#shared/ranking/chance'

/** What the rode passes on by wind speed: at the grid's speeds (m/s, rising from 0), and at any speed between. */
export interface DemandTable {
  speedsMs: readonly number[]
  points: readonly DemandPoint[]
  at: (speedMs: number) => DemandPoint
}

const toleranceMs = 1e-6
const toleranceScore = 1e-8

/** Index of the last grid speed whose score is at least 0; the first is known to be. Scores fall with the wind. */
function lastPassing(table: DemandTable, score: (point: DemandPoint) => number): number {
  let low = 0
  let high = table.points.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    const point = table.points[middle]
    if (point !== undefined && score(point) >= 0) low = middle
    else high = middle
  }
  return low
}

/**
 * Where the score passes 0 between two speeds: regula falsi (Illinois), halving wherever a score is infinite or the step
 * stays one-sided too long, so that it always ends.
 */
function crossing(low: number, high: number, scoreAt: (speedMs: number) => number): number {
  let lowScore = scoreAt(low)
  let highScore = scoreAt(high)
  let side = 0
  for (let i = 0; i < 80 && high - low > toleranceMs; i++) {
    const halving = i % 8 === 7 || !Number.isFinite(lowScore) || !Number.isFinite(highScore)
    const middle = halving ? (low + high) / 2 : low + (high - low) * lowScore / (lowScore - highScore)
    const score = scoreAt(middle)
    if (Math.abs(score) < toleranceScore) return middle
    if (score >= 0) {
      low = middle
      lowScore = score
      if (side > 0 && !halving) highScore /= 2
      side = 1
    }
    else {
      high = middle
      highScore = score
      if (side < 0 && !halving) lowScore /= 2
      side = -1
    }
  }
  return low
}

/**
 * The greatest wind speed at which a score is still at least 0, by bracketed search on the table.
 *
 * @param table demand by wind, tabulated once per plan
 * @param score at one point of it; once at least 0 it only falls as the wind rises
 * @returns m/s, null where the score is below 0 in calm, Infinity where it is at least 0 at the table's last speed
 */
export function greatestSpeed(table: DemandTable, score: (point: DemandPoint) => number): number | null {
  const first = table.points[0]
  const last = table.points[table.points.length - 1]
  if (first === undefined || last === undefined) throw new RangeError('demand table must hold at least 1 speed, got 0')
  if (!(score(first) >= 0)) return null
  if (score(last) >= 0) return Infinity
  const i = lastPassing(table, score)
  return crossing(table.speedsMs[i] ?? 0, table.speedsMs[i + 1] ?? 0, speedMs => score(table.at(speedMs)))
}
