import { describe, expect, it } from 'vitest'
import { holdingAtMass, sizeExponent } from '#shared/seabed/seabeds'
import { readChartNotation } from '#shared/seabed/notation'
import { layersInWords } from '#shared/seabed/notationText'
import published from './published.json'

// UFC 4-159-03 (2005) eq. 26, W_R 4536 kg; exponents of its tables 5-3 and 5-4 from memory.
describe('holding and mass against UFC 4-159-03', () => {
  it('has the published exponents', () => {
    expect(sizeExponent('soft-mud')).toBe(published.sizeExponent.soft)
    expect(sizeExponent('loose-sand')).toBe(published.sizeExponent.hard)
  })

  it('agrees with the worked values to their printed digits', () => {
    const [small, doubling] = published.sizeExponent.worked
    expect(holdingAtMass(560e3, 4536, 15, 0.8) / 1000).toBeCloseTo(small!.expected, 3)
    expect(holdingAtMass(1, 10, 20, 0.8)).toBeCloseTo(doubling!.expected, 4)
  })
})

// IHO INT 1 section J; S-57 attributes NATSUR (113) and NATQUA (114).
describe('chart notation against INT 1 and S-57', () => {
  it.each(Object.entries(published.chartNotation.nouns))('reads the noun %s', (abbreviation, [word, code]) => {
    const { layers, unread } = readChartNotation(abbreviation)
    expect(layers).toEqual([[{ noun: word, natsur: code, qualifiers: [], natqua: [] }]])
    expect(unread).toEqual([])
  })

  it.each(Object.entries(published.chartNotation.qualifiers))('reads the qualifier %s', (abbreviation, [word, code]) => {
    const { layers, unread } = readChartNotation(`${abbreviation}S`)
    expect(layers).toEqual([[{ noun: 'sand', natsur: 4, qualifiers: [word], natqua: [code] }]])
    expect(unread).toEqual([])
  })

  it.each(published.chartNotation.worked)('reads $input as $expected', ({ input, expected, natsur }) => {
    const { layers, unread } = readChartNotation(input)
    expect(layersInWords(layers)).toBe(expected)
    expect(unread).toEqual([])
    if (natsur) expect(layers.flat().map(constituent => constituent.natsur)).toEqual(natsur)
  })
})
