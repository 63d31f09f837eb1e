import { describe, expect, it } from 'vitest'
import { compareAnchors } from '#shared/ranking/compare'
import { listed, pairInWords, summaryOf } from '#shared/ranking/compareWords'
import { rankDesigns } from '#shared/ranking/rank'
import type { AnchorWanted, ComparisonAnswer, ComparisonRequest } from '#shared/types/comparison'
import { makeCovariance, makeDesign, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

const names = ['alder', 'birch', 'cedar', 'elm']
const catalogue = names.map(slug => makeDesign(slug))
const sand = [makeEstimate('alder', 4000), makeEstimate('birch', 3100), makeEstimate('cedar', 3000), makeEstimate('elm', 2000, { pulls: 3, days: 1 })]
const mud = [makeEstimate('alder', 1500), makeEstimate('birch', 3000), makeEstimate('cedar', 2400), makeEstimate('elm', 900, { pulls: 0, days: 0, massRangeKg: null, mostShown15KgN: null })]
const fit = makeFit([
  makeSeabedFit('firm-mud', mud, { exponent: 0.92, covariance: makeCovariance([0.1, 0.1, 0.1, 0.3], 0.05, 0.08, 0.001) }),
  makeSeabedFit('loose-sand', sand, { covariance: makeCovariance([0.1, 0.1, 0.1, 0.2], 0.05, 0.08, 0.001) }),
  makeSeabedFit('gravel', names.map(name => makeEstimate(name, 1000, { pulls: 0, days: 0 }))),
])
const compare = (anchors: AnchorWanted[], more: Partial<ComparisonRequest> = {}) => compareAnchors({ anchors, ...more }, catalogue, fit)
const two = [{ design: 'alder' }, { design: 'birch' }]
const mix = [{ seabed: 'loose-sand' as const, share: 0.6 }, { seabed: 'firm-mud' as const, share: 0.4 }]

describe('compareAnchors', () => {
  it('without a plan takes a flat pull at a common mass, on every seabed that any of them was pulled on', () => {
    const answer = compare(two)
    expect(answer.massKg).toBe(15)
    expect(answer.seabeds.map(({ seabed, share }) => [seabed, share])).toEqual([['firm-mud', null], ['loose-sand', null]])
    expect(answer.seabeds[1]?.holdings[0]?.holdingN.median).toBeCloseTo(4000, 6)
    expect(answer.seabeds[1]?.holdings[0]).toMatchObject({ chance: null, holdingWind: null })
    expect([answer.loadN, answer.upliftFactor, answer.anchors[0]?.worst]).toEqual([null, null, null])
    // ln(4000/3100) = 0.2549 with sd 0.1414: Phi(1.802) = 0.964
    expect(answer.seabeds[1]?.pairs[0]?.chance).toBeCloseTo(0.964, 3)
    expect(answer.seabeds[1]?.pairs[0]?.words).toBe('Alder very likely holds more than Birch on loose sand: a chance of 96 %.')
  })

  it('with a plan says what the ranking says of the same anchors', () => {
    const plan = makePlan({ seabeds: mix })
    const answer = compare(two, { plan })
    const ranking = rankDesigns(plan, catalogue, fit)
    expect(answer.massKg).toBe(20)
    expect(answer.loadN).toBe(ranking.load.survey.totalN)
    for (const [i, { design, worst, weightedChance }] of answer.anchors.entries()) {
      const row = ranking.rows.find(entry => entry.design === design)
      expect([worst, weightedChance]).toEqual([row?.worst, row?.weightedChance])
      answer.seabeds.forEach(({ seabed, holdings }) => {
        const ranked = row?.seabeds.find(entry => entry.seabed === seabed)
        expect(holdings[i]).toMatchObject({ chance: ranked?.chance, holdingWind: ranked?.holdingWind, holdingN: ranked?.holdingN })
      })
    }
    expect(answer.cautions).toEqual(ranking.cautions)
  })

  it('says the same whatever the order of the anchors', () => {
    const key = ({ anchors, seabeds }: ComparisonAnswer) => {
      const name = (i: number) => `${anchors[i]?.design}/${anchors[i]?.massKg}`
      return new Map(seabeds.flatMap(({ seabed, pairs }) => pairs.flatMap(({ first, second, chance, oneTry, verdict, words }) => [
        [`${seabed} ${name(first)} ${name(second)}`, [chance.toFixed(12), oneTry.toFixed(12), verdict, words]] as const,
        [`${seabed} ${name(second)} ${name(first)}`, [(1 - chance).toFixed(12), (1 - oneTry).toFixed(12), verdict, words]] as const,
      ])))
    }
    const anchors = [{ design: 'alder', massKg: 16 }, { design: 'birch', massKg: 20 }, { design: 'cedar' }, { design: 'alder', massKg: 25 }]
    const more = { massKg: 18, plan: makePlan({ seabeds: mix }) }
    const forth = compare(anchors, more)
    const back = compare([...anchors].reverse(), more)
    expect(forth.seabeds.map(({ pairs }) => pairs.length)).toEqual([6, 6])
    expect([...key(back)].sort()).toEqual([...key(forth)].sort())
    expect(key(forth).size).toBe(24)
    const other = compareAnchors({ anchors, ...more }, [...catalogue].reverse(), fit)
    expect(other).toEqual(forth)
  })

  it('does not judge a design that was hardly pulled, and says so', () => {
    const { seabeds, summary } = compare([{ design: 'alder' }, { design: 'elm' }])
    expect(seabeds.map(({ pairs }) => pairs[0]?.verdict)).toEqual(['notTested', 'notTested'])
    expect(seabeds[1]?.pairs[0]?.words).toBe('Too few pulls on loose sand to judge Alder against Elm.')
    expect(summary).toEqual(['Alder against Elm: too few pulls were made to judge by on firm mud and loose sand.'])
  })

  it('cannot tell where the order is a coin-toss', () => {
    const { seabeds, summary } = compare([{ design: 'birch' }, { design: 'cedar' }])
    // ln(3100/3000) = 0.0328 with sd 0.1414: Phi(0.232) = 0.592
    expect(seabeds[1]?.pairs[0]).toMatchObject({ verdict: 'cannotTell', words: 'Cannot tell Birch and Cedar apart on loose sand: Birch is ahead with a chance of 59 %, a coin-toss.' })
    expect(summary).toEqual(['Birch against Cedar: Birch holds more, very likely on firm mud; the pulls cannot tell them apart on loose sand.'])
  })

  it('names masses where they differ, and says when they are scaled', () => {
    const { seabeds } = compare([{ design: 'alder', massKg: 15 }, { design: 'alder', massKg: 50 }])
    expect(seabeds[1]?.pairs[0]?.words).toMatch(/^Alder of 50 kg very likely holds more than Alder of 15 kg on loose sand/)
    expect(seabeds[1]?.holdings.map(holding => holding?.scaledFromKg)).toEqual([null, 20])
  })

  it('says of a seabed without a number that it has none', () => {
    const { seabeds, cautions } = compare(two, { plan: makePlan({ seabeds: [{ seabed: 'rock', share: 0.3 }, { seabed: 'loose-sand', share: 0.7 }] }) })
    expect(seabeds[0]).toMatchObject({ seabed: 'rock', share: 0.3, holdings: [null, null], pairs: [] })
    expect(cautions.join()).toMatch(/Rock, 30 % of the mix, has no holding figure/)
  })

  it('still compares medians where the rode cannot bound the load', () => {
    const plan = makePlan({ seabeds: mix, swell: 'open', rode: { chain: { lengthM: 45, diameterMm: 10 } } })
    const answer = compare(two, { plan })
    expect(answer.loadN).toBeNull()
    expect(answer.seabeds[0]?.pairs[0]?.verdict).toBe('veryLikely')
    expect(answer.seabeds[0]?.holdings[0]?.chance).toBeNull()
  })

  it('refuses an unknown design and an anchor against itself, by the field', () => {
    expect(() => compare([{ design: 'alder' }, { design: 'oak' }])).toThrow(expect.objectContaining({ field: 'anchors.1.design' }) as Error)
    expect(() => compare([{ design: 'alder' }, { design: 'alder', massKg: 15 }])).toThrow(expect.objectContaining({ field: 'anchors.1.design' }) as Error)
    expect(() => compare(two, { plan: makePlan({ depthM: 60 }) })).toThrow(expect.objectContaining({ field: 'plan.rode.chain.lengthM' }) as Error)
  })
})

describe('the words', () => {
  it('put the likelier anchor first, and say the number', () => {
    expect(pairInWords(['A', 'B'], { chance: 0.2, verdict: 'moreLikely' }, 'gravel')).toMatch(/^B more likely than not holds more than A on .*gravel.*: a chance of 80 %\.$/)
    expect(pairInWords(['A', 'B'], { chance: 0.9999, verdict: 'veryLikely' }, 'gravel')).toMatch(/more than 99 %\.$/)
  })

  it('gather seabeds', () => {
    expect([listed([]), listed(['a']), listed(['a', 'b']), listed(['a', 'b', 'c'])]).toEqual(['', 'a', 'a and b', 'a, b and c'])
    expect(summaryOf(['A', 'B'], [
      { seabed: 'loose-sand', chance: 0.95, verdict: 'veryLikely' },
      { seabed: 'firm-mud', chance: 0.2, verdict: 'moreLikely' },
      { seabed: 'hard-sand', chance: 0.97, verdict: 'veryLikely' },
    ])).toBe('A against B: A holds more, very likely on loose sand and hard sand; B holds more, more likely than not on firm mud.')
    expect(summaryOf(['A', 'B'], [])).toBe('A against B: nothing is known of both on any of these seabeds.')
  })
})
