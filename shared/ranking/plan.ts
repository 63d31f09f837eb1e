import type { LoadAnswer } from '#shared/types/load'
import type { PlanAnswer, PlanGround } from '#shared/types/plan'
import type { RankingRequest } from '#shared/types/ranking'
import type { Rode, RodeAnswer } from '#shared/types/rode'
import { completeBoat } from '#shared/load/boat'
import { surgeEnergyJ } from '#shared/load/energy'
import { ruleTable } from '#shared/load/ruleTable'
import { answerRode } from '#shared/rode/answer'
import { clearanceM, heightToBow, swingRadiusM } from '#shared/rode/height'
import { snubberAdvice } from '#shared/rode/snubber'
import { FieldError } from '#shared/utils/fieldError'
import { planCautions } from '#shared/ranking/cautions'
import { answerLoads } from '#shared/ranking/planLoad'
import { withRodeFields } from '#shared/ranking/rodeFields'

/** A rode without any load has no shape to solve: calm is taken as a hundredth of a newton. */
const calmN = 0.01

function rodeLength({ chain, rope }: Rode): number {
  return chain.lengthM + (rope?.lengthM ?? 0)
}

/** Refuses a rode that does not reach from the bow to the seabed, before anything is worked out from it. */
function checkReach(rode: Rode, heightM: number): void {
  const lengthM = rodeLength(rode)
  if (lengthM > heightM) return
  const field = rode.rope && rode.rope.lengthM > 0 ? 'rode.rope.lengthM' : 'rode.chain.lengthM'
  throw new FieldError(field, `too short to reach the bottom: ${lengthM} m of rode, the height from seabed to bow is ${Number(heightM.toFixed(2))} m`)
}

/** How the rode lies at the survey total, and what its parts bear at the design load. */
function rodeAt(rode: Rode, heightM: number, { survey, designN }: LoadAnswer): RodeAnswer | null {
  if (survey.totalN === null || designN === null) return null
  const horizontalLoadN = Math.max(survey.totalN, calmN)
  return withRodeFields(() => {
    const answer = answerRode({ ...rode, heightM, horizontalLoadN })
    if (designN <= horizontalLoadN) return answer
    const { strength, weakest } = answerRode({ ...rode, heightM, horizontalLoadN: designN })
    return { ...answer, strength, weakest }
  })
}

/**
 * What a ranking starts from: load, rode, heights, clearances, rule tables and cautions.
 *
 * @param request the plan, as the reader gives it
 * @throws FieldError as answerPlan
 */
export function planGround(request: RankingRequest): PlanGround {
  const { rode, depthM, riseM = 0, fallM = 0, waveHeightM = 0, swell = 'none' } = request
  const boat = completeBoat(request.boat)
  const heightM = heightToBow(depthM, riseM, waveHeightM, boat.bowHeightM)
  checkReach(rode, heightM)
  const load = answerLoads({ boat: request.boat, wind: request.wind, currentMs: request.currentMs, swell, rode, heightM })
  const rodeAnswer = rodeAt(rode, heightM, load)
  const rule = ruleTable(boat.lengthM, request.boat.waterline?.lengthM)
  return {
    boat,
    heightM,
    lowWaterDepthM: depthM - fallM,
    clearanceM: clearanceM(depthM, fallM, boat.waterline.draughtM),
    swingRadiusM: swingRadiusM({ depthM, fallM, bowHeightM: boat.bowHeightM, rodeM: rodeLength(rode), lengthOverallM: boat.lengthM }),
    energyJ: surgeEnergyJ(boat.displacementKg, swell),
    load,
    rode: rodeAnswer,
    massKg: request.massKg ?? request.own?.massKg ?? rule.anchorKg,
    ruleTables: [rule],
    cautions: planCautions(request, load, rodeAnswer),
  }
}

/**
 * Everything of a plan that needs no estimates: what a ranking starts from, and what a snubber does. The page draws from it
 * as words change.
 *
 * @param request the plan, as the reader gives it
 * @throws FieldError naming the field that is missing or out of range, a rode "too short to reach the bottom" included
 */
export function answerPlan(request: RankingRequest): PlanAnswer {
  const ground = planGround(request)
  const { rode, depthM } = request
  const { heightM, energyJ, load: { designN, survey } } = ground
  const loads = { designN: designN === null ? null : Math.max(designN, calmN), steadyN: survey.gustN, energyJ }
  return { ...ground, snubber: withRodeFields(() => snubberAdvice({ rode, heightM, depthM, ...loads })) }
}
