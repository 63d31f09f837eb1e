import { describe, expect, it } from 'vitest'
import type { ModificationRatio, SeabedWorth } from '#shared/types/modification'
import type { Show } from '~/utils/show'
import { moneyInWords } from '~/utils/money'
import { answerInWords, byWeight, changeWords, costInWords, judgeWorth } from '~/utils/modification/words'
import { sideWords } from '~/utils/modification/plots'

/** Units spelt out plainly: what is tested is the sentence. */
const show = { force: (n: number) => `${(n / 1000).toFixed(1)} kN`, speed: (ms: number) => `${ms.toFixed(0)} m/s`, mass: (kg: number) => `${Number(kg.toFixed(1))} kg` } as Show

const ratio = (seabed: ModificationRatio['seabed'], verdict: ModificationRatio['verdict']): ModificationRatio =>
  ({ design: 'alder', seabed, ratio: { median: 1, low90: 0.9, high90: 1.1 }, pulls: 6, pairs: verdict === null ? 0 : 6, verdict })

const worth = (seabed: ModificationRatio['seabed'], verdict: ModificationRatio['verdict'], changeN: number, sameAsKg = 20): SeabedWorth => ({
  design: 'alder', seabed, verdict,
  unmodifiedN: { median: 5000, low90: 4000, high90: 6000 },
  changeN: { median: changeN, low90: changeN - 500, high90: changeN + 500 },
  unmodifiedWind: null,
  changeMs: { gust: { median: changeN / 500, low90: -9, high90: 9 }, mean: { median: 0, low90: 0, high90: 0 }, capped: false },
  sameAsKg: { median: sameAsKg, low90: sameAsKg - 3, high90: sameAsKg + 3 },
})
const all = (...seabeds: SeabedWorth[]) => ({ massKg: 20, loadN: 2000, upliftFactor: 1, seabeds })
const price = { minor: 9500, currency: 'EUR', on: '2026-09-01' }
const sizes = [16, 20, 27, 34].map(massKg => ({ design: 'alder', massKg, price: { minor: 10_000 + 1000 * massKg, currency: 'EUR' } }))

describe('does it matter, and where?', () => {
  it('is answered from the verdicts, seabed by seabed', () => {
    expect(answerInWords({ ratios: [ratio('firm-mud', 'worse'), ratio('loose-sand', 'noDifference'), ratio('soft-mud', 'worse'), ratio('gravel', 'cannotTell')] }))
      .toMatch(/^Yes: it holds less on firm mud and soft mud; it makes no difference that matters on loose sand; the pulls cannot tell on .*gravel\.$/)
    expect(answerInWords({ ratios: [ratio('firm-mud', 'noDifference')] })).toBe('No: it makes no difference that matters on firm mud.')
    expect(answerInWords({ ratios: [ratio('firm-mud', 'noDifference'), ratio('silt', 'cannotTell')] })).toBe('It makes no difference that matters on firm mud; the pulls cannot tell on silt.')
    expect(answerInWords({ ratios: [ratio('firm-mud', null)] })).toMatch(/^There are no back-to-back pairs/)
    expect(answerInWords({ ratios: [] })).toBe('Nobody has pulled it yet.')
  })
})

describe('whether it is worth its price', () => {
  it('is what it buys where it is better, and what weight alone would cost', () => {
    expect(judgeWorth({ price }, all(worth('firm-mud', 'better', 1500, 26), worth('loose-sand', 'better', 1000, 24)), sizes, show))
      .toEqual(['For EUR 95 it buys about 1.5 kN of holding and 3 m/s of gusting wind on firm mud. By weight alone that takes the size of 27 kg, EUR 70 more.'])
  })

  it('is what leaving it undone is worth where it is worse', () => {
    expect(judgeWorth({ price: null }, all(worth('firm-mud', 'worse', -2000, 11)), sizes, show))
      .toEqual(['Whatever it costs, it takes away about 2.0 kN of holding and 4 m/s of gusting wind on firm mud: leaving the anchor as it is, is worth that much.'])
  })

  it('is nothing where nothing matters, and unsaid where the pulls cannot tell', () => {
    expect(judgeWorth({ price }, all(worth('firm-mud', 'noDifference', 20), worth('silt', 'cannotTell', 900), worth('soft-mud', null, 900)), sizes, show))
      .toEqual(['For EUR 95 it buys no holding that matters on firm mud.', 'On silt and soft mud the pulls cannot tell whether it is worth anything.'])
    expect(judgeWorth({ price }, all(), sizes, show)).toEqual([])
  })

  it('by weight takes the lightest size that holds as much; none where none is made, or nothing is gained', () => {
    expect(byWeight(worth('firm-mud', 'better', 1, 20.5), 20, sizes)).toEqual({ massKg: 27, extra: 'EUR 70' })
    expect(byWeight(worth('firm-mud', 'better', 1, 60), 20, sizes)).toBeNull()
    expect(byWeight(worth('firm-mud', 'worse', -1, 12), 20, sizes)).toBeNull()
    expect(byWeight(worth('firm-mud', 'better', 1, 20.5), 19, sizes)).toEqual({ massKg: 27, extra: null })
  })
})

describe('what it costs and weighs', () => {
  it('is said as far as it is stated', () => {
    expect(costInWords({ price, addedMassKg: 1.1 }, show)).toBe('It costs EUR 95 and adds 1.1 kg.')
    expect(costInWords({ price: null, addedMassKg: -1.9 }, show)).toBe('No price is stated; it takes off 1.9 kg.')
    expect(costInWords({ price, addedMassKg: null }, show)).toBe('It costs EUR 95; what it weighs is not stated.')
  })

  it('is money with its currency', () => {
    expect([moneyInWords(56995, 'EUR'), moneyInWords(9500, 'EUR'), moneyInWords(123456789, 'USD'), moneyInWords(-4500, 'EUR')]).toEqual(['EUR 569.95', 'EUR 95', 'USD 1,234,567.89', '-EUR 45'])
  })
})

describe('a change', () => {
  it('has its sign, its unit once, and its interval', () => {
    expect(changeWords({ median: -2100, low90: -2700, high90: 300 }, show.force, n => (n / 1000).toFixed(1))).toBe('−2.1 kN (−2.7 to +0.3)')
  })
})

describe('one side of a pair', () => {
  const pull = { massKg: 20, setting: 'set' as const, heldN: 1300, movedN: 1500, end: 'dragged' as const, fouling: 'clean' as const }

  it('says what was held, or why nothing was', () => {
    expect(sideWords([pull], show)).toBe('held 1.3 kN, moved at 1.5 kN')
    expect(sideWords([{ ...pull, heldN: 4500, movedN: null, end: 'atTheLimit' }], show)).toBe('held 4.5 kN, the rig’s limit')
    expect(sideWords([{ ...pull, heldN: 4500, movedN: null, end: 'stoppedEarly' }], show)).toBe('held 4.5 kN, stopped early')
    expect(sideWords([{ ...pull, heldN: 0 }], show)).toBe('moved at the first step')
    expect(sideWords([{ ...pull, setting: 'setAfterDragging' }], show)).toMatch(/, set after dragging$/)
    expect(sideWords([{ ...pull, setting: 'fouled', heldN: 0, movedN: null, end: null }], show)).toBe('fouled')
    expect(sideWords([], show)).toBe('–')
  })
})
