import { describe, expect, it } from 'vitest'
import { rankDesigns } from '#shared/ranking/rank'
import type { RankingRequest } from '#shared/types/ranking'
import { KN_MS } from '#shared/units/constants'
import { makeDesign, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

const names = ['alder', 'birch', 'cedar', 'elm']
const catalogue = names.map(name => makeDesign(name))

/** alder best on sand, birch best on mud, cedar weak on both, elm hardly pulled on mud */
const fit = makeFit([
  makeSeabedFit('loose-sand', [makeEstimate('alder', 5000), makeEstimate('birch', 3500), makeEstimate('cedar', 1200), makeEstimate('elm', 6000)]),
  makeSeabedFit('firm-mud', [
    makeEstimate('alder', 2600), makeEstimate('birch', 4200), makeEstimate('cedar', 1500), makeEstimate('elm', 5000, { pulls: 4, days: 2 }),
  ]),
])

const mix = [{ seabed: 'loose-sand' as const, share: 0.6 }, { seabed: 'firm-mud' as const, share: 0.4 }]
const rank = (more: Partial<RankingRequest> = {}) => rankDesigns(makePlan({ seabeds: mix, ...more }), catalogue, fit)

describe('rankDesigns', () => {
  it('orders by the worst seabed\'s holding wind, and names it', () => {
    const { rows, thin, massKg, hidden } = rank()
    expect(rows.map(({ design, rank: place, worst }) => [design, place, worst?.seabed])).toEqual([
      ['birch', 1, 'loose-sand'], ['alder', 2, 'firm-mud'], ['cedar', 3, 'loose-sand'],
    ])
    expect(thin.map(({ design, rank: place }) => [design, place])).toEqual([['elm', null]])
    expect([massKg, hidden]).toEqual([20, 0])
  })

  it('orders by the weighted chance when asked to', () => {
    const { rows } = rank({ order: 'weighted', seabeds: [{ seabed: 'loose-sand', share: 0.95 }, { seabed: 'firm-mud', share: 0.05 }] })
    expect(rows.map(({ design }) => design)).toEqual(['alder', 'birch', 'cedar'])
    for (const row of rows) {
      expect(row.weightedChance).toBeCloseTo(row.seabeds.reduce((sum, { share, chance }) => sum + share * (chance ?? 0), 0), 12)
    }
  })

  it('ranks only where every numbered seabed of the mix has 5 pulls on 2 days', () => {
    expect(rank({ seabeds: [{ seabed: 'loose-sand', share: 1 }] }).rows[0]?.design).toBe('elm')
    const withElm = (pulls: number, days: number) => {
      const seabed = makeSeabedFit('loose-sand', [makeEstimate('elm', 5000, { pulls, days })])
      return rankDesigns(makePlan(), [makeDesign('elm')], makeFit([seabed])).rows.length
    }
    expect([withElm(5, 2), withElm(4, 4), withElm(9, 1)]).toEqual([1, 0, 0])
  })

  it('keeps a design that the fit does not know, without a figure', () => {
    const { thin } = rankDesigns(makePlan(), [makeDesign('oak')], fit)
    expect(thin[0]).toMatchObject({ design: 'oak', rank: null, worst: null, weightedChance: 0, smallestServing: { survey: null, table: null } })
    expect(thin[0]?.seabeds[0]).toMatchObject({ chance: null, holdingN: null, holdingWind: null, pulls: 0 })
    expect(thin[0]?.sizes.every(({ chanceWorst }) => chanceWorst === null)).toBe(true)
  })

  it('counts a seabed without a number as not held in the weighted chance, and not at all in the worst', () => {
    const alone = rank({ seabeds: [{ seabed: 'loose-sand', share: 1 }] })
    const withRock = rank({ seabeds: [{ seabed: 'loose-sand', share: 0.7 }, { seabed: 'rock', share: 0.2 }, { seabed: 'shell', share: 0.1 }] })
    expect(withRock.rows.map(({ design }) => design)).toEqual(alone.rows.map(({ design }) => design))
    withRock.rows.forEach((row, i) => {
      expect(row.weightedChance).toBeCloseTo(0.7 * (alone.rows[i]?.weightedChance ?? Number.NaN), 12)
      expect(row.worst).toEqual(alone.rows[i]?.worst)
      expect(row.sizes).toEqual(alone.rows[i]?.sizes)
    })
    expect(withRock.cautions.join('\n')).toMatch(/Rock, 20 % of the mix, has no holding figure/)
    expect(withRock.cautions.join('\n')).toMatch(/Shell, 10 % of the mix, has no holding figure/)
  })

  it('gives no ranking past one half without a number, and does at one half', () => {
    const half = rank({ seabeds: [{ seabed: 'loose-sand', share: 0.5 }, { seabed: 'rock', share: 0.5 }], own: { design: 'alder', massKg: 20 } })
    expect(half.rows.length).toBe(4)
    const more = rank({ seabeds: [{ seabed: 'loose-sand', share: 0.49 }, { seabed: 'rock', share: 0.51 }], own: { design: 'alder', massKg: 20 } })
    expect([more.rows, more.thin]).toEqual([[], []])
    expect(more.own?.verdict).toBe('notTested')
    expect(more.cautions.join('\n')).toMatch(/no ranking is given/)
  })

  it('says nothing of a seabed whose estimates rest on no pull at all', () => {
    const empty = makeFit([...fit.seabeds, makeSeabedFit('silt', names.map(name => makeEstimate(name, 3000, { pulls: 0, days: 0 })))])
    const { rows } = rankDesigns(makePlan({ seabeds: [{ seabed: 'loose-sand', share: 0.8 }, { seabed: 'silt', share: 0.2 }] }), catalogue, empty)
    expect(rows[0]?.seabeds[1]).toMatchObject({ seabed: 'silt', chance: null })
  })

  it('has no rows where the rode cannot bound the load, and everything else', () => {
    const { rows, thin, own, load, rode, cautions } = rank({ swell: 'open', rode: { chain: { lengthM: 45, diameterMm: 10 } }, own: { design: 'alder', massKg: 20 } })
    expect([rows, thin, own, rode, load.designN]).toEqual([[], [], null, null, null])
    expect(cautions.length).toBeGreaterThan(5)
  })

  it('says that one tester\'s bias cannot be seen while there is one rig', () => {
    const caution = 'All pulls by one tester and one boat: a bias common to all of them cannot be seen.'
    expect(rankDesigns(makePlan(), catalogue, fit, { rigs: 1 }).cautions).toContain(caution)
    expect(rankDesigns(makePlan(), catalogue, fit, { rigs: 2 }).cautions).not.toContain(caution)
  })

  it('names the field of a mass that the rule table cannot give, and of an unknown own anchor', () => {
    expect(() => rank({ massKg: undefined, boat: { type: 'motor', lengthM: 40, beamM: 8 } })).toThrow(expect.objectContaining({ field: 'massKg' }))
    expect(() => rank({ own: { design: 'nothing', massKg: 20 } })).toThrow(expect.objectContaining({ field: 'own.design' }))
  })
})

describe('sizes', () => {
  it('finds the smallest real size that reaches the target, and the one that meets the table load', () => {
    const { rows } = rank({ seabeds: [{ seabed: 'loose-sand', share: 1 }], wind: { speedMs: 20 * KN_MS, kind: 'gust' } })
    for (const row of rows) {
      const serving = row.sizes.filter(({ chanceWorst }) => (chanceWorst ?? 0) >= 0.9).map(({ massKg }) => massKg)
      expect(row.smallestServing.survey).toBe(serving[0] ?? null)
      row.sizes.forEach(({ chanceWorst }, i) => expect(chanceWorst ?? -1).toBeGreaterThanOrEqual(row.sizes[i - 1]?.chanceWorst ?? 0))
    }
  })

  it('meets the table load by the median, less what the angle at that load takes', () => {
    // 1600 lbf x (20/30)^2 = 3163 N; 5000 N at 15 kg is 5000 x (10/15)^0.8 = 3615 N at 10 kg
    const table = (lengthM: number) => rank({
      seabeds: [{ seabed: 'loose-sand', share: 1 }],
      wind: { speedMs: 20 * KN_MS, kind: 'gust' },
      rode: { chain: { lengthM, diameterMm: 10 } },
    }).rows.find(({ design }) => design === 'alder')
    // 90 m stays on the bottom: it lifts sqrt(h^2 + 2 h a) = 56 m of it, h 9.17 m, a = 3163/18.75 m
    expect(table(90)?.smallestServing.table).toBe(10)
    // 45 m lifts the shank by some 3 degrees, which leaves less than 3163/3615 of it
    expect(table(45)?.smallestServing.table).toBe(15)
    // at 20 kg: 5000 (20/15)^0.8 = 6294 N, met at 30 kn x sqrt(6294 / 7117), flat
    expect((table(200)?.seabeds[0]?.tableWindMs ?? 0) / KN_MS).toBeCloseTo(30 * Math.sqrt(6294 / 7117), 1)
  })

  it('answers null where none of its sizes serves', () => {
    const { rows } = rank()
    expect(rows.find(({ design }) => design === 'cedar')?.smallestServing).toEqual({ survey: null, table: null })
  })

  it('marks what is scaled beyond half and twice the masses pulled', () => {
    const scaledAt = (massKg: number) => rank({ massKg }).rows[0]?.seabeds[0]?.scaledFromKg
    expect([scaledAt(7.4), scaledAt(7.5), scaledAt(20), scaledAt(40), scaledAt(41)]).toEqual([15, null, null, null, 20])
  })
})

describe('the own anchor', () => {
  const verdictOf = (massKg: number, more: Partial<RankingRequest> = {}) => rank({ own: { design: 'alder', massKg }, ...more }).own

  it('is judged at its own mass, on its worst seabed, by the target', () => {
    const own = verdictOf(16)
    const worst = Math.min(...(own?.row.seabeds ?? []).map(({ chance }) => chance ?? 1))
    expect(worst).toBeGreaterThan(0.5)
    expect(worst).toBeLessThan(0.9)
    expect(own?.verdict).toBe('marginal')
    expect(verdictOf(60)?.verdict).toBe('holds')
    expect(verdictOf(5)?.verdict).toBe('doesNotHold')
    expect(rank({ own: { design: 'elm', massKg: 60 } }).own?.verdict).toBe('notTested')
  })

  it('changes with the target alone', () => {
    const verdicts = ([0.8, 0.9, 0.95] as const).map(target => verdictOf(26, { target })?.verdict)
    expect(verdicts).toEqual(['holds', 'holds', 'marginal'])
  })

  it('carries its rank where it stands in the ranking at that mass, and none elsewhere', () => {
    expect(verdictOf(20)?.row).toMatchObject({ design: 'alder', rank: 2 })
    expect(verdictOf(16)?.row.rank).toBeNull()
    expect(rank({ own: { design: 'alder', massKg: 16 }, massKg: undefined })).toMatchObject({ massKg: 16, own: { row: { rank: 2 } } })
  })
})

describe('reasons', () => {
  it('say load, holding with its interval, uplift factor, pulls on days, and what would change the answer', () => {
    const [first, second, third] = rank().rows.map(({ reason }) => reason)
    expect(first).toMatch(/^On loose sand, its worst seabed here, at 20 kg it holds an estimated 4\.4 kN \(90 % interval \d\.\d kN to \d\.\d kN\) against 2\.1 kN asked; /)
    expect(first).toMatch(/the rode's angle leaves 97 % of that: a chance of \d\d % once set\. 12 pulls on 4 days\. Would change it: a wind past its holding wind, mean \d\d kn, gusting \d\d, or a worse seabed/)
    expect(second).toMatch(/a bigger one; \d\d kg reaches 90 % on every seabed here\.$/)
    expect(third).toMatch(/none of its sizes reaches 90 % here\.$/)
    expect(rank().thin[0]?.reason).toMatch(/more pulls on firm mud, at least 5 on at least 2 days\.$/)
  })

  it('speak of the cap, of a steep rode and of an anchor that seldom sets', () => {
    const withEstimate = (more: Parameters<typeof makeEstimate>[2]) => makeFit([makeSeabedFit('loose-sand', [makeEstimate('alder', 6000, more)])])
    const one = [makeDesign('alder')]
    const capped = rankDesigns(makePlan(), one, withEstimate({ mostShown15KgN: 2500, atLimit: 12 })).rows[0]
    expect(capped?.worst?.holdingWind).toMatchObject({ atLeast: true })
    expect(capped?.reason).toMatch(/12 of them to the rig's limit\. Would change it: pulls to a higher load; none here showed more than mean \d\d kn, gusting \d\d\.$/)
    const steep = rankDesigns(makePlan({ depthM: 15, wind: { speedMs: 42 * KN_MS, kind: 'gust' } }), one, withEstimate({})).rows[0]
    expect(steep?.reason).toMatch(/more chain or a longer rode/)
    const unset = rankDesigns(makePlan(), one, withEstimate({ setShare: { mean: 0.6, low90: 0.4, high90: 0.8, n: 10 } })).rows[0]
    expect(unset?.reason).toMatch(/set at the first try in an estimated 60 %: count on trying again\./)
  })
})
