import { describe, expect, it } from 'vitest'
import { answerRode } from '#shared/rode/answer'
import { upliftFactor } from '#shared/rode/uplift'
import { answerPlan } from '#shared/ranking/plan'
import { KN_MS } from '#shared/units/constants'
import { makePlan } from '../../factories/plan'

describe('answerPlan', () => {
  it('takes depth, rise, half the wave height and the bow for the height; low water for swing and clearance', () => {
    const plan = answerPlan(makePlan({ riseM: 1.5, fallM: 2, waveHeightM: 0.6 }))
    const bowHeightM = 0.06 * 11.2 + 0.5
    expect(plan.heightM).toBeCloseTo(8 + 1.5 + 0.3 + bowHeightM, 12)
    expect(plan.lowWaterDepthM).toBe(6)
    expect(plan.clearanceM).toBeCloseTo(6 - 0.16 * 11.2, 12)
    // seamanship practice: length overall and the straight rode's reach
    expect(plan.swingRadiusM).toBeCloseTo(11.2 + Math.sqrt(45 ** 2 - (6 + bowHeightM) ** 2), 9)
    expect(plan.massKg).toBe(20)
  })

  it('shows the rode at the survey total, and its strength at the design load', () => {
    const request = makePlan()
    const { rode, load, heightM, snubber } = answerPlan(request)
    const same = answerRode({ ...request.rode, heightM, horizontalLoadN: load.survey.totalN ?? 0 })
    expect(rode).toMatchObject({ regime: same.regime, shankAngleDeg: same.shankAngleDeg, curve: same.curve })
    expect(rode?.upliftFactor).toBeCloseTo(upliftFactor(same.shankAngleDeg * Math.PI / 180), 12)
    expect(load.designN).toBeGreaterThan(load.survey.totalN ?? Infinity)
    expect(rode?.strength[0]?.loadN).toBeGreaterThanOrEqual(load.designN ?? Infinity)
    expect(snubber.stretchM).toBeGreaterThan(0)
  })

  it('takes the mass asked for, else the own anchor\'s, else the rule table\'s, else none', () => {
    const own = { design: 'alder', massKg: 16 }
    expect(answerPlan(makePlan({ own })).massKg).toBe(20)
    expect(answerPlan(makePlan({ own, massKg: undefined })).massKg).toBe(16)
    // UK small-vessel code table 20.1: mean length (11.2 + 0.88 x 11.2)/2 = 10.5 m, row 11 m, 15 kg
    expect(answerPlan(makePlan({ massKg: undefined })).massKg).toBe(15)
    const large = makePlan({ massKg: undefined, boat: { type: 'motor', lengthM: 40, beamM: 8 } })
    expect(answerPlan(large).massKg).toBeNull()
  })

  it('refuses a rode too short to reach the bottom, naming its field', () => {
    const chain = { lengthM: 9, diameterMm: 10 }
    expect(() => answerPlan(makePlan({ rode: { chain } }))).toThrow(expect.objectContaining({ field: 'rode.chain.lengthM', message: expect.stringMatching(/too short to reach the bottom/) }))
    const mixed = { chain: { lengthM: 4, diameterMm: 8 }, rope: { lengthM: 5, diameterMm: 14 } }
    expect(() => answerPlan(makePlan({ rode: mixed }))).toThrow(expect.objectContaining({ field: 'rode.rope.lengthM' }))
  })

  it('answers a calm without a number that is not one', () => {
    const plan = answerPlan(makePlan({ wind: { speedMs: 0, kind: 'mean' } }))
    expect(plan.load.survey.totalN).toBe(0)
    expect(plan.rode?.regime).toBe('grounded')
  })

  it('has no rode where the load is unbounded, and still says everything else', () => {
    const plan = answerPlan(makePlan({ swell: 'open', rode: { chain: { lengthM: 45, diameterMm: 10 } } }))
    expect(plan.rode).toBeNull()
    expect(plan.cautions).toContain('This rode has nothing left to stretch: fit a snubber.')
    expect(plan.ruleTables[0]?.anchorKg).toBe(15)
  })
})

describe('cautions of a plan', () => {
  it('always says these, word for word', () => {
    expect(answerPlan(makePlan()).cautions).toEqual(expect.arrayContaining([
      'An estimate from short pulls on someone else\'s bottom. It is not a promise: keep an anchor watch.',
      'Assumes the anchor is set. Back down hard and watch a transit before you trust it.',
      'A wind shift, weed on the point or a stone in the fluke can undo a good set. Check after every shift.',
      'Not for leaving the boat unattended, and not for named storms.',
      'The windlass is not a strong point. Take the load on a snubber or chain stopper made to a cleat or bitts.',
      'Holding is not strength: no pull here tested a shank sideways. Strong points, rode and shackles are for a surveyor or rigger to judge.',
      'Standards quoted from memory: check the current edition.',
    ]))
  })

  it('speaks of mud on mud, of seagrass and coral, of shallow water and of a lifted shank only where they apply', () => {
    const cautionsOf = (more: Parameters<typeof makePlan>[0]) => answerPlan(makePlan(more)).cautions.join('\n')
    const mud = /Mud was pulled within minutes\. A long soak may raise holding; a long blow may lower it\./
    expect(cautionsOf({ seabeds: [{ seabed: 'soft-mud', share: 1 }] })).toMatch(mud)
    expect(cautionsOf({})).not.toMatch(mud)
    const harm = /Seagrass and coral: anchoring is forbidden in many places and harmful in all\. Local rules come first\./
    expect(cautionsOf({ seabeds: [{ seabed: 'loose-sand', share: 0.7 }, { seabed: 'seagrass', share: 0.3 }] })).toMatch(harm)
    expect(cautionsOf({ seabeds: [{ seabed: 'loose-sand', share: 0.7 }, { seabed: 'seagrass', share: 0.3 }] })).toMatch(/Seagrass, 30 % of the mix/)
    expect(cautionsOf({})).not.toMatch(harm)
    const shallow = /Shallow water needs more scope and a longer snubber, not less\./
    expect(cautionsOf({ depthM: 4.9 })).toMatch(shallow)
    expect(cautionsOf({ depthM: 5 })).not.toMatch(shallow)
    expect(cautionsOf({ wind: { speedMs: 50 * KN_MS, kind: 'gust' }, depthM: 16 })).toMatch(/past 15 degrees/)
    expect(cautionsOf({})).not.toMatch(/past 15 degrees/)
  })
})
