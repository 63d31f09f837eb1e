import { describe, expect, it } from 'vitest'
import { comparisonQuery, readAnchors } from '~/utils/compare/address'
import { carriedPlan, carriesPlan } from '~/utils/plan/carried'
import { readQuery } from '~/utils/plan/typed'

const known = new Set(['alder', 'birch', 'cedar', 'elm', 'oak'])
const read = (query: Record<string, string | string[]>) => readAnchors(query, known, 'asAtSea')

describe('the anchors of an address', () => {
  it('are a slug and a mass in kg', () => {
    expect(read({ d: ['alder:20', 'birch:12.5', 'cedar'] })).toEqual({ anchors: [{ design: 'alder', massKg: 20 }, { design: 'birch', massKg: 12.5 }, { design: 'cedar' }], notes: [] })
    expect(read({ d: 'alder:20' }).anchors).toHaveLength(1)
    expect(read({})).toEqual({ anchors: [], notes: [] })
  })

  it('may come from a form, the mass beside the name as a reader types it', () => {
    const { anchors, notes } = read({ d: ['alder', 'birch', '', ''], m: ['44 lb', '', '', ''] })
    expect(notes).toEqual([])
    // 1 lb is 0.45359237 kg (international pound)
    expect(anchors[0]?.massKg).toBeCloseTo(44 * 0.45359237, 9)
    expect(anchors[1]).toEqual({ design: 'birch' })
  })

  it('leave out what cannot be, and say so', () => {
    const { anchors, notes } = read({ d: ['no-such:9', '<script>', 'alder:lots', 'birch:-3', 'cedar:1e9', 'alder', 'constructor', '__proto__:5'] })
    expect(anchors).toEqual([{ design: 'alder' }, { design: 'birch' }, { design: 'cedar' }])
    expect(notes).toHaveLength(8)
    expect(notes.join('\n')).toMatch(/no design “no-such”[\s\S]*mass “lots” cannot be read[\s\S]*“alder” stands twice/)
  })

  it('are four at most, each once', () => {
    const { anchors, notes } = read({ d: ['alder:9', 'alder:9', 'alder:10', 'birch', 'cedar', 'elm'] })
    expect(anchors).toHaveLength(4)
    expect(notes).toEqual(['“alder:9” stands twice: once is enough.', 'At most four anchors are compared: “elm” was left out.'])
  })

  it('are written as they are read', () => {
    const anchors = [{ design: 'alder', massKg: 20 }, { design: 'birch' }]
    expect(comparisonQuery(anchors)).toEqual({ d: ['alder:20', 'birch'] })
    expect(read(comparisonQuery(anchors)).anchors).toEqual(anchors)
    expect(comparisonQuery(anchors, { wind: '30 kn' })).toEqual({ d: ['alder:20', 'birch'], wind: '30 kn' })
  })
})

describe('the plan of an address', () => {
  it('is there where any word of it is, and nothing else goes with it', () => {
    expect(carriesPlan({ d: ['alder', 'birch'], m: '9' })).toBe(false)
    expect(carriedPlan({ d: 'alder' })).toEqual({})
    expect(carriesPlan({ wind: '30 kn', d: 'alder' })).toBe(true)
    const carried = carriedPlan({ wind: '35 kn', d: 'alder', m: '9', constructor: 'x' })
    expect(carried.wind).toBe('35 kn')
    expect(Object.keys(carried)).not.toContain('d')
    expect(readQuery(carried)).toEqual(readQuery({ wind: '35 kn' }))
  })
})
