import type { PullAfter, PullEnd, SettingOutcome } from '../../shared/types/words'
import type { WorldDesign, WorldPull, WorldTrial } from './types'
import type { PlannedPull } from './plan'
import type { PulledSeabed } from './truth/holding'
import type { RandomStream } from './random'
import { upliftFactor } from '../../shared/rode/uplift'
import { attitudeOf, conditionOf, foulingOf, noteOf } from './details'
import { randomStream } from './random'
import { rig } from './trials'
import { trueLnMedian, trueModificationRatio, trueNeverSetShare, trueTemper } from './truth'
import { anchorDaySd, firstPullWeak, notFreshShare, pullSd, rigErrorLn } from './truth/holding'
import { endShares, fouledShare, setAfterDraggingShare } from './truth/setting'

/** Load at which a pull meant for turning is stopped, N: one of the thrust steps. */
export const veerStopN = 1500
const neverWeak: readonly PulledSeabed[] = ['soft-mud', 'firm-mud', 'sandy-mud', 'cobble-over-sand']

type Loads = Pick<WorldPull, 'heldN' | 'movedN' | 'end' | 'after' | 'creepRateMPerMin' | 'veerDeg' | 'veerOutcome'>

/** Everything that one pull's fate depends on. */
interface Case { trial: WorldTrial, plan: PlannedPull, design: WorldDesign, seabed: PulledSeabed, fresh: boolean, random: RandomStream, seed: string }

function settingOf({ design, seabed, fresh, random }: Case): SettingOutcome {
  if (!fresh) return 'set'
  if (random.chance(fouledShare)) return 'fouled'
  if (random.chance(trueNeverSetShare(design.slug, seabed))) return 'neverSet'
  return random.chance(setAfterDraggingShare[seabed]) ? 'setAfterDragging' : 'set'
}

/** The load in N that this pull would bear before it moves; weak marks a first pull that breaks out early. */
function holdingN({ trial, plan, design, seabed, fresh, random, seed }: Case): { loadN: number, weak: boolean } {
  const day = randomStream(`${seed}/anchor-day/${trial.slug}/${design.slug}`).normal() * anchorDaySd
  const weak = plan.firstOfDay && fresh && !neverWeak.includes(seabed) && random.chance(firstPullWeak.chance)
  const ratio = (plan.modification === null ? 1 : trueModificationRatio(plan.modification, seabed))
    * upliftFactor(trial.shankAngleDeg * Math.PI / 180) * (weak ? firstPullWeak.share : 1) * (fresh ? 1 : notFreshShare)
  const ln = trueLnMedian(design.slug, seabed, plan.massKg) + Math.log(ratio) + day + rigErrorLn + pullSd[seabed] * random.normal()
  return { loadN: Math.exp(ln), weak }
}

function endOf({ design, seabed, random }: Case, weak: boolean): PullEnd {
  const shares = endShares[seabed]
  const brokeOut = Math.min(0.9, shares.brokeOut * trueTemper(design.family, seabed).breakoutFactor)
  const draw = random.uniform()
  if (weak || draw < brokeOut) return 'brokeOut'
  return draw < brokeOut + shares.crept ? 'crept' : 'dragged'
}

function afterOf({ design, seabed, random }: Case): PullAfter {
  if (random.chance(0.15)) return 'notTried'
  return random.chance(trueTemper(design.family, seabed).resetShare) ? 'reset' : 'didNotReset'
}

function veerOf({ design, seabed, random }: Case): Pick<WorldPull, 'veerDeg' | 'veerOutcome'> {
  const { veerStaysShare, veerResetsShare } = trueTemper(design.family, seabed)
  const veerDeg = random.pick([70, 90, 120, 180])
  if (random.chance(veerStaysShare)) return { veerDeg, veerOutcome: 'stayedBuried' }
  return { veerDeg, veerOutcome: random.chance(veerResetsShare) ? 'brokeOutAndReset' : 'brokeOutAndDidNotReset' }
}

/** Up the thrust table until it moves, the limit, or the turn. */
function loadsOf(pull: Case): Loads {
  const { loadN, weak } = holdingN(pull)
  const none = { after: null, creepRateMPerMin: null, veerDeg: null, veerOutcome: null }
  if (pull.plan.veer && pull.fresh && loadN > veerStopN) {
    return { ...none, heldN: veerStopN, movedN: null, end: 'stoppedEarly', ...veerOf(pull) }
  }
  const movedN = rig.thrustStepsN.find(step => step >= loadN) ?? null
  if (movedN === null) return { ...none, heldN: rig.limitN, movedN, end: 'atTheLimit' }
  const heldN = rig.thrustStepsN[rig.thrustStepsN.indexOf(movedN) - 1] ?? 0
  const end = endOf(pull, weak)
  return {
    ...none,
    heldN,
    movedN,
    end,
    after: end === 'brokeOut' ? afterOf(pull) : null,
    creepRateMPerMin: end === 'crept' ? Math.round((0.1 + 2.4 * pull.random.uniform()) * 10) / 10 : null,
  }
}

const unloaded: Loads = { heldN: 0, movedN: null, end: null, after: null, creepRateMPerMin: null, veerDeg: null, veerOutcome: null }

/** One pull from its plan. `fresh` false: it follows a breakout without lifting the anchor. */
export function simulatePull(
  trial: WorldTrial, plan: PlannedPull, design: WorldDesign, order: number, fresh: boolean, seed: string,
): WorldPull {
  const seabed = trial.seabed as PulledSeabed
  const random = randomStream(`${seed}/pull/${trial.slug}/${order}`)
  const pull: Case = { trial, plan, design, seabed, fresh, random, seed }
  const setting = settingOf(pull)
  const loads = setting === 'neverSet' || setting === 'fouled' ? unloaded : loadsOf(pull)
  const outcome = { family: design.family, seabed, setting, end: loads.end, heldN: loads.heldN }
  const condition = conditionOf(outcome, random)
  return {
    trial: trial.slug,
    order,
    design: design.slug,
    massKg: plan.massKg,
    anchorSetting: design.settings.length === 0 ? null : seabed === 'soft-mud' ? 'mud' : 'sand',
    modification: plan.modification,
    pair: plan.pair,
    seabed,
    setting,
    firstTry: fresh && setting === 'set',
    ...loads,
    attitude: attitudeOf(outcome, random),
    fouling: foulingOf(outcome, random),
    condition,
    fresh,
    eastM: plan.eastM,
    northM: plan.northM,
    note: noteOf(outcome, condition, random),
  }
}
