import { describe, expect, it } from 'vitest'
import { fitHolding } from '#shared/holding/fitHolding'
import { countEffects, recordOf } from '#shared/holding/readRequest'
import { answerFit } from '#shared/holding/whatWouldTheySay'
import type { FitPull } from '#shared/types/fit'
import { simulateCampaign } from '../../factories/campaign'

const one = (changes: Partial<FitPull> = {}): FitPull => ({
  trial: 't', design: 'd', family: 'claw', massKg: 15, seabed: 'loose-sand', heldN: 1000, movedN: 1440, ...changes,
})

const campaign = simulateCampaign({
  seed: 8, designs: 4, families: 2, seabeds: ['firm-mud', 'loose-sand'], trialsPerSeabed: 3, designsPerTrial: 3, pullsPerDay: 2,
}).pulls

describe('what would these pulls say, pooled', () => {
  it('answers as the published fit does', () => {
    const answer = answerFit({ pulls: campaign })
    const fit = fitHolding(campaign)
    expect(answer.dataHash).toBe(fit.dataHash)
    expect(answer.sigma).toBe(fit.sigma)
    expect(answer.sds).toEqual(fit.sds)
    for (const estimate of answer.estimates) {
      const design = fit.seabeds.find(({ seabed }) => seabed === estimate.seabed)!.designs.find(({ design }) => design === estimate.design)!
      expect(estimate.lnMean15Kg).toBeCloseTo(design.lnMean15Kg, 10)
      expect(estimate.lnSd).toBeCloseTo(design.lnSd, 10)
    }
  })

  it('predicts a cell that never set from its family, and leaves a seabed where nothing set without a number', () => {
    const { estimates } = answerFit({
      pulls: [...campaign, one({ design: 'new', set: false, heldN: 0, movedN: null }), one({ seabed: 'gravel', set: false, heldN: 0, movedN: null })],
    })
    const predicted = estimates.find(({ design }) => design === 'new')!
    expect(predicted).toMatchObject({ pulls: 0, plainMeans: [{ massKg: 15, meanN: 0, pulls: 1 }] })
    expect(predicted.lnSd).toBeGreaterThan(0.2)
    expect(predicted.why).toMatch(/family/)
    expect(estimates.find(({ seabed }) => seabed === 'gravel')).toMatchObject({ lnMean15Kg: null, lnSd: null, why: expect.any(String) })
  })

  it('answers a modified anchor with its own holding', () => {
    const { estimates } = answerFit({ pulls: [...campaign, one({ design: 'd0', family: 'hinged-plough', modification: 'cut' })] })
    expect(estimates.filter(({ design, seabed }) => design === 'd0' && seabed === 'loose-sand').map(({ modification }) => modification)).toEqual([null, 'cut'])
  })
})

describe('what would these pulls say, not pooled', () => {
  it('gives a cell the middle of what its pulls have in common where nothing identifies the spread', () => {
    const { estimates: [estimate], sigma } = answerFit({ pulls: [one(), one({ heldN: 900, movedN: 1210 })], pooled: false })
    expect(sigma).toBeNull()
    expect(estimate!.lnMean15Kg).toBeCloseTo(Math.log(1100), 12)
    expect(estimate).toMatchObject({ lnSd: null, why: expect.stringMatching(/spread/) })
  })

  it('gives no mean where every pull reached the limit or moved at the first step', () => {
    const { estimates } = answerFit({
      pulls: [one({ movedN: null }), one({ design: 'low', heldN: 0, movedN: 300 }), ...campaign.slice(0, 12)], pooled: false,
    })
    expect(estimates.find(({ design }) => design === 'd')).toMatchObject({ lnMean15Kg: null, why: expect.stringMatching(/upper bound/), atLimit: 1 })
    expect(estimates.find(({ design }) => design === 'low')).toMatchObject({ lnMean15Kg: null, why: expect.stringMatching(/lower bound/) })
  })

  it('has no random effects', () => {
    expect(Object.values(answerFit({ pulls: campaign, pooled: false }).sds).every(sd => sd === 0)).toBe(true)
  })

  it('brings masses and angles to 15 kg and a flat pull by the published figures', () => {
    const { estimates: [estimate] } = answerFit({ pulls: [one({ massKg: 30, shankAngleDeg: 10 })], pooled: false })
    expect(estimate!.lnMean15Kg).toBeCloseTo(Math.log(1200) - 0.8 * Math.log(2) - Math.log(0.6), 12)
  })
})

describe('requests out of range', () => {
  it('are refused by name', () => {
    expect(() => answerFit({ pulls: [] })).toThrow(/pulls must be between 1 and 5000, got 0/)
    expect(() => answerFit({ pulls: [one({ heldN: 0, movedN: null })] })).toThrow(/pulls\[0\]\.heldN must be above 0/)
    const many = Array.from({ length: 400 }, (_, i) => one({ design: `d${i}`, trial: `t${i}` }))
    expect(() => answerFit({ pulls: many })).toThrow(/effects must be between 0 and 1000, got 1203/)
  })

  it('count effects before anchor-days', () => {
    // mu, beta, family on seabed, design, design on seabed, trial
    expect(countEffects([one(), one()].map(recordOf))).toBe(6)
    expect(countEffects([recordOf(one({ rig: 'r' })), recordOf(one({ modification: 'cut', set: true }))])).toBe(9)
    expect(countEffects([recordOf(one({ set: false }))])).toBe(0)
  })
})
