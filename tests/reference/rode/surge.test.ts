import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { elasticSpan } from '#shared/rode/elasticSpan'
import { peakOn } from '#shared/rode/energyPeak'
import { forceCurve } from '#shared/rode/forceCurve'

interface Elastic { id: string, note: string, inputs: Record<string, number>, outputs: Record<string, number> }
interface Worked { massKg: number, stiffnessNPerM: number, speedMs: number, steadyN: number, expected: number }

const read = (name: string): unknown => JSON.parse(readFileSync(new URL(name, import.meta.url), 'utf8'))
const { elastic } = read('./catenary.json') as { elastic: Elastic[] }
const { surge } = read('./published.json') as { surge: { worked: Worked[] } }

// Source: the elastic cases of catenary.json; they bound the approximation by stretch in series: 0.3 % of the span.
describe('span with stretch in series', () => {
  it.each(elastic.map(one => [one.id, one.note, one] as const))('%s: %s', (_id, _note, { inputs, outputs }) => {
    const part = { lengthM: inputs.unstretched_length_m ?? 0, weightNPerM: inputs.submerged_weight_N_per_m_unstretched ?? 0 }
    const input = { heightM: inputs.height_m ?? 0, horizontalLoadN: inputs.horizontal_load_N ?? 0, chain: part }
    const spanM = elasticSpan(input, { chainN: inputs.EA_N ?? 0 })
    const expected = outputs.horizontal_distance_m ?? 0
    expect(Math.abs(spanM / expected - 1)).toBeLessThan(0.003)
    const asRope = { ...input, chain: { lengthM: 0, weightNPerM: 0 }, rope: part }
    expect(elasticSpan(asRope, { ropeN: inputs.EA_N ?? 0 })).toBeCloseTo(spanM, 9)
  })

  it('reads both cases', () => {
    expect(elastic.map(({ id }) => id)).toEqual(['E01', 'E03'])
  })
})

// Source: energy balance of a linear spring by hand: 7525 kg at 0.5 m/s on 5 kN/m from 4000 N peaks at 7067 N.
it.each(surge.worked)('a linear spring peaks at $expected N', ({ massKg, stiffnessNPerM, speedMs, steadyN, expected }) => {
  const curve = forceCurve(loadN => loadN / stiffnessNPerM, 0, 1e6)
  const peakN = peakOn(curve, steadyN, massKg * speedMs ** 2 / 2) ?? 0
  expect(Math.round(peakN)).toBe(expected)
  expect(peakN).toBeCloseTo(steadyN + speedMs * Math.sqrt(stiffnessNPerM * massKg), 6)
})
