import type { RankingRequest } from '#shared/types/ranking'
import type { PlanGround } from '#shared/types/plan'
import { gustFactor, meanAndGust } from '#shared/load/gust'
import { windLoadFactors } from '#shared/load/survey'
import { tableLoad } from '#shared/load/table'
import { solveRode } from '#shared/rode/catenary'
import { surgeReader } from '#shared/rode/surge'
import { publishedUpliftLimitRad, upliftFactor } from '#shared/rode/uplift'
import { solverInput } from '#shared/rode/weights'
import { KN_MS } from '#shared/units/constants'
import { demandPoint, type DemandPoint } from '#shared/ranking/chance'
import type { PlanDemand } from '#shared/ranking/context'
import { tabulateDemand } from '#shared/ranking/demand'
import { tabulateAngle, type AngleAt } from '#shared/ranking/rodeTable'
import { greatestSpeed, type DemandTable } from '#shared/ranking/speedSearch'

/** The greatest wind said as a number, m/s: 64 kn, as a gust for holding winds, as entered for the table load (ours). */
export const greatestWindMs = 64 * KN_MS

/** Peak above the gust's load (N) by that load; null where the rode cannot bound it; nothing without swell. */
function surgeOver({ rode }: RankingRequest, { heightM, energyJ }: PlanGround): (gustN: number) => number | null {
  if (energyJ === 0) return () => 0
  const read = surgeReader(rode, heightM)
  return (gustN) => {
    const { peakN } = read(gustN, energyJ)
    return peakN === null ? null : Math.max(0, peakN - gustN)
  }
}

/** Survey total (N) by gust speed: max(sheer, gust + surge) + current. */
function surveyByGust(request: RankingRequest, plan: PlanGround): (gustMs: number) => number | null {
  const perSquare = windLoadFactors(plan.boat, { ...request.wind, kind: 'gust' })
  const surgeAt = surgeOver(request, plan)
  const { currentN } = plan.load.survey
  return (gustMs) => {
    const square = gustMs ** 2
    const surgeN = surgeAt(perSquare.gust * square)
    return surgeN === null ? null : Math.max(perSquare.sheer * square, perSquare.gust * square + surgeN) + currentN
  }
}

/** Table load with current (N) by the wind as entered; null outside the table. */
function tableByWind({ boat, load }: PlanGround): ((speedMs: number) => number) | null {
  const most = tableLoad(boat, greatestWindMs).table
  if (most === null) return null
  return speedMs => most.loadN * (speedMs / greatestWindMs) ** 2 + load.survey.currentN
}

/** Greatest survey load that the rode bounds, up to the greatest wind: the tables of angles end there. */
function greatestLoad(loadAt: (speedMs: number) => number | null): number {
  for (let speed = 64; speed > 0; speed--) {
    const loadN = loadAt(greatestWindMs * speed / 64)
    if (loadN !== null) return loadN
  }
  return 0
}

/** Gust (m/s) up to which the rode leaves at least this share of holding; Infinity past the table. */
function gustLeaving(table: DemandTable, share: number): number {
  return greatestSpeed(table, ({ lnLoad, lnUplift }) => lnLoad === Infinity ? -Infinity : lnUplift - Math.log(share)) ?? 0
}

const liftedPoints = 96

/** Demand at lesser winds than the plan's, from the published angles' limit to where the uplift factor stops falling. */
function liftedBefore(table: DemandTable, gustMs: number): DemandPoint[] {
  const from = gustLeaving(table, upliftFactor(publishedUpliftLimitRad))
  if (from >= gustMs) return []
  const to = Math.min(gustMs, gustLeaving(table, upliftFactor(Math.PI / 2) + 1e-9))
  return Array.from({ length: liftedPoints }, (_, i) => table.at(from + (to - from) * i / liftedPoints))
}

/**
 * What the plan asks of an anchor, at its own wind and tabulated by wind: worked out once, read for every design, size and
 * seabed. At the plan's own wind load and angle are the solved ones, not read from a table.
 *
 * @param plan the same request, answered
 * @returns null where the rode cannot bound the load
 */
export function planDemand(request: RankingRequest, plan: PlanGround): PlanDemand | null {
  const surveyN = plan.load.survey.totalN
  if (surveyN === null) return null
  const solved: AngleAt = loadN => loadN > 0 ? solveRode(solverInput(request.rode, plan.heightM, loadN)).shankAngleRad : 0
  const surveyAt = surveyByGust(request, plan)
  const tableAt = tableByWind(plan)
  const mostN = Math.max(1.25 * greatestLoad(surveyAt), 1.01 * (tableAt?.(greatestWindMs) ?? 0), 10)
  const angleAt = tabulateAngle(solved, mostN)
  const angleRad = solved(surveyN)
  const tableN = tableAt?.(request.wind.speedMs)
  const byGust = tabulateDemand(surveyAt, angleAt, greatestWindMs)
  return {
    surveyN,
    upliftFactor: upliftFactor(angleRad),
    survey: demandPoint(surveyN, angleRad),
    lifted: liftedBefore(byGust, meanAndGust(request.wind).gustMs),
    surveyByGust: byGust,
    gustFactor: gustFactor(request.wind.exposure),
    table: tableN === undefined ? null : demandPoint(tableN, solved(tableN)),
    tableByWind: tableAt === null ? null : tabulateDemand(tableAt, angleAt, greatestWindMs),
  }
}
