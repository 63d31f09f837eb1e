import { upliftFactor } from '#shared/rode/uplift'
import { sizeExponent } from '#shared/seabed/seabeds'
import type { HoldingSds, PullRecord } from '#shared/types/holding'
import type { Family, NumberedSeabed } from '#shared/types/words'
import { randomNumbers } from './randomNumbers'
import type { RandomNumbers } from './randomNumbers'

/** A simulated campaign of pulls from known true values. Everything in it is invented. */
export interface CampaignPlan {
  seed: number
  designs: number
  families: number
  seabeds: readonly NumberedSeabed[]
  /** trials on each seabed, designs pulled in each trial, pulls of each design there */
  trialsPerSeabed: number
  designsPerTrial: number
  pullsPerDay: number
  /** share of pulls made with a modified anchor, in back-to-back pairs */
  modifiedShare?: number
  /** share of pulls where the anchor never sets */
  neverSetShare?: number
  sds?: Partial<HoldingSds & { sigma: number }>
  /** number of rigs, each with a calibration error of sd 0.10; 0: none named, no error */
  rigs?: number
  /** greatest load of the rig, and its first step, N */
  limitN?: number
  firstN?: number
  /** width of a load step as a factor; loads are powers of it */
  step?: number
  massesKg?: readonly number[]
  anglesDeg?: readonly number[]
}

export interface Campaign {
  pulls: PullRecord[]
  /** true ln N at 15 kg, flat pull, perfect rig, of each design and seabed */
  truth: Map<string, number>
  sds: HoldingSds & { sigma: number }
}

export const campaignSds: HoldingSds & { sigma: number } = {
  family: 0.3, design: 0.2, designSeabed: 0.2, modification: 0.15, modificationSeabed: 0.1, trial: 0.15, anchorDay: 0.2, sigma: 0.35,
}

const familyNames: readonly Family[] = [
  'hinged-plough', 'fixed-plough', 'claw', 'pivoting-fluke', 'light-alloy-pivoting-fluke', 'roll-bar-scoop', 'weighted-tip-scoop',
  'plain-scoop', 'fisherman',
]

export const truthKey = (design: string, seabed: string): string => `${design} ${seabed}`

/** Draws an effect once and keeps it. */
function effects(random: RandomNumbers): (key: string, sd: number) => number {
  const drawn = new Map<string, number>()
  return (key, sd) => {
    const value = drawn.get(key) ?? sd * random.normal()
    drawn.set(key, value)
    return value
  }
}

/** The step a holding falls in: loads rise by a factor up to the rig's limit. */
function stepped(holdingN: number, step: number, limitN: number, firstN: number): Pick<PullRecord, 'heldN' | 'movedN'> {
  if (holdingN < firstN) return { heldN: 0, movedN: firstN }
  let heldN = firstN
  while (heldN * step <= holdingN && heldN * step <= limitN) heldN *= step
  return { heldN, movedN: heldN * step > limitN ? null : heldN * step }
}

function pick(random: RandomNumbers, count: number, from: number): number[] {
  const all = Array.from({ length: from }, (_, i) => i)
  return Array.from({ length: Math.min(count, from) }, () => all.splice(random.below(all.length), 1)[0]!)
}

/** Simulates a campaign; the same plan gives the same pulls. */
export function simulateCampaign(plan: CampaignPlan): Campaign {
  const random = randomNumbers(plan.seed)
  const sds = { ...campaignSds, ...plan.sds }
  const effect = effects(random)
  const { step = 1.18, limitN = 4500, firstN = 300, massesKg = [15, 20, 25], anglesDeg = [0], rigs = 1, modifiedShare = 0, neverSetShare = 0 } = plan
  const designs = Array.from({ length: plan.designs }, (_, d) => ({ design: `d${d}`, family: familyNames[d % plan.families]! }))
  const truth = new Map<string, number>()
  for (const seabed of plan.seabeds) {
    const mean = Math.log(2200) + effect(`mu ${seabed}`, 0.5)
    effect(`beta ${seabed}`, 0.05)
    for (const { design, family } of designs) {
      truth.set(truthKey(design, seabed), mean + effect(`f ${family} ${seabed}`, sds.family) + effect(`a ${design}`, sds.design)
      + effect(`g ${design} ${seabed}`, sds.designSeabed))
    }
  }
  const pulls = plan.seabeds.flatMap(seabed => Array.from({ length: plan.trialsPerSeabed }, (_, t) => {
    const trial = `${seabed}-${t}`
    const rig = rigs > 0 ? `rig${t % rigs}` : undefined
    const shankAngleDeg = anglesDeg[t % anglesDeg.length]!
    return pick(random, plan.designsPerTrial, designs.length).flatMap((index) => {
      const { design, family } = designs[index]!
      const massKg = massesKg[random.below(massesKg.length)]!
      return Array.from({ length: plan.pullsPerDay }, (_, p): PullRecord => {
        const modified = index < 4 && random.uniform() < modifiedShare
        const neverSet = neverSetShare > 0 && random.uniform() < neverSetShare
        const tau = modified
          ? effect(`tau ${design}`, sds.modification) + effect(`tau ${design} ${seabed}`, sds.modificationSeabed)
          : 0
        const ln = truth.get(truthKey(design, seabed))! + tau
          + (sizeExponent(seabed) + effect(`beta ${seabed}`, 0.05)) * Math.log(massKg / 15)
          + Math.log(upliftFactor(shankAngleDeg * Math.PI / 180))
          + effect(`u ${trial}`, sds.trial) + effect(`w ${trial} ${design}`, sds.anchorDay) + (rig === undefined ? 0 : effect(`v ${rig}`, 0.1))
          + sds.sigma * random.normal()
        return {
          trial, ...(rig === undefined ? {} : { rig }), design, family, massKg, seabed, shankAngleDeg,
          ...(neverSet ? { set: false, heldN: 0, movedN: null } : { set: true, ...stepped(Math.exp(ln), step, limitN, firstN) }),
          ...(modifiedShare > 0 ? { pair: `${index}-${p >> 1}` } : {}), ...(modified ? { modification: 'blunted-edge' } : {}),
        }
      })
    })
  }).flat())
  return { pulls, truth, sds }
}
