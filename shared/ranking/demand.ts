import { demandPoint, unboundedDemand } from '#shared/ranking/chance'
import type { AngleAt } from '#shared/ranking/rodeTable'
import type { DemandTable } from '#shared/ranking/speedSearch'

const steps = 128

/**
 * Demand by wind speed from calm to the greatest speed, in 128 equal steps: half a knot each up to 64 kn.
 *
 * @param loadAt load at a speed (m/s), N; null where the rode cannot bound it, which counts as not held
 * @param angleAt shank angle (rad) by load (N)
 * @param mostSpeedMs greatest speed, m/s
 */
export function tabulateDemand(loadAt: (speedMs: number) => number | null, angleAt: AngleAt, mostSpeedMs: number): DemandTable {
  const at = (speedMs: number) => {
    const loadN = loadAt(speedMs)
    if (loadN === null) return unboundedDemand
    return demandPoint(loadN, loadN > 0 ? angleAt(loadN) : 0)
  }
  const speedsMs = Array.from({ length: steps + 1 }, (_, i) => mostSpeedMs * i / steps)
  return { speedsMs, points: speedsMs.map(at), at }
}
