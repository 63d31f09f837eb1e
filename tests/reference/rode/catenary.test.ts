import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { solveRode, type RodeInput } from '#shared/rode/catenary'
import { leastLength } from '#shared/rode/leastLength'

interface Case { id: string, note: string, inputs: Record<string, number>, outputs: Record<string, number> }
interface Checks { source: string, cases: Case[] }

const checks = JSON.parse(readFileSync(new URL('./catenary.json', import.meta.url), 'utf8')) as Checks

/** A named figure of a case; a missing one fails the test. */
function figure(figures: Record<string, number>, name: string): number {
  const value = figures[name]
  if (value === undefined) throw new Error(`no ${name} in the reference`)
  return value
}

function inputOf({ inputs }: Case): RodeInput {
  const ropeM = figure(inputs, 'rope_length_m')
  return {
    heightM: figure(inputs, 'height_seabed_to_bow_m'),
    horizontalLoadN: figure(inputs, 'horizontal_load_N'),
    chain: {
      lengthM: figure(inputs, 'chain_length_m'),
      weightNPerM: figure(inputs, 'chain_submerged_weight_N_per_m'),
    },
    ...(ropeM > 0 ? { rope: { lengthM: ropeM, weightNPerM: figure(inputs, 'rope_submerged_weight_N_per_m') } } : {}),
  }
}

/** 1e-6 relative, the figures being printed to six decimals. */
function near(got: number, expected: number): void {
  expect(Math.abs(got - expected)).toBeLessThanOrEqual(1e-6 * Math.abs(expected) + 5.1e-7)
}

// Source: catenary.json (closed form, shooting and pin-jointed bars).
describe('rode shapes with known answers', () => {
  it.each(checks.cases.map(one => [one.id, one.note, one] as const))('%s: %s', (_id, _note, one) => {
    const shape = solveRode(inputOf(one))
    const deg = 180 / Math.PI
    near(shape.shankAngleRad * deg, figure(one.outputs, 'uplift_angle_deg'))
    near(shape.groundedChainM, figure(one.outputs, 'chain_on_seabed_m'))
    near(shape.groundedRopeM, figure(one.outputs, 'rope_on_seabed_m'))
    near(shape.spanM, figure(one.outputs, 'horizontal_distance_m'))
    near(shape.tensionBowN, figure(one.outputs, 'tension_bow_N'))
    near(shape.tensionAnchorN, figure(one.outputs, 'tension_anchor_N'))
    near(shape.verticalAnchorN, figure(one.outputs, 'vertical_anchor_N'))
    near(shape.verticalBowN, figure(one.outputs, 'vertical_bow_N'))
    near(shape.bowAngleRad * deg, figure(one.outputs, 'bow_angle_deg'))
  })

  it('reads eight cases, and calls them by their regimes', () => {
    expect(checks.cases.map(one => solveRode(inputOf(one)).regime)).toEqual([
      'grounded', 'grounded', 'lifting', 'clear', 'grounded', 'clear', 'grounded', 'clear',
    ])
  })
})

interface Extreme extends RodeInput { note: string, expected: Record<string, number> }
const { cases: extremes } = JSON.parse(readFileSync(new URL('./extremes.json', import.meta.url), 'utf8')) as { cases: Extreme[] }

// Source: shapes.py, the closed form in 50 decimal digits.
describe('extreme shapes', () => {
  it.each(extremes.map(one => [one.note, one] as const))('%s', (_note, { note: _, expected, ...input }) => {
    const shape = solveRode(input)
    const rodeM = input.chain.lengthM + (input.rope?.lengthM ?? 0)
    const loadN = figure(expected, 'tensionBowN')
    const errors = {
      chain: (shape.groundedChainM - figure(expected, 'chainOnSeabedM')) / rodeM,
      rope: (shape.groundedRopeM - figure(expected, 'ropeOnSeabedM')) / rodeM,
      span: shape.spanM / figure(expected, 'spanM') - 1,
      bow: shape.tensionBowN / loadN - 1,
      anchor: shape.tensionAnchorN / figure(expected, 'tensionAnchorN') - 1,
      upAnchor: (shape.verticalAnchorN - figure(expected, 'verticalAnchorN')) / figure(expected, 'tensionAnchorN'),
      upBow: (shape.verticalBowN - figure(expected, 'verticalBowN')) / loadN,
    }
    for (const [name, error] of Object.entries(errors)) expect(Math.abs(error), name).toBeLessThan(1e-9)
  })

  it('reads fourteen', () => {
    expect(extremes).toHaveLength(14)
  })
})

// Source: MIT course 2.019, Design of Ocean Systems, lecture on mooring: T 1510 kN at the fairlead, w 828 N/m, h 25 m;
// the least line that leaves the pull on the anchor flat is h sqrt(2 T / (w h) - 1) = 300.93 m.
describe('least length of a mooring line', () => {
  const heightM = 25
  const weightNPerM = 828
  const horizontalLoadN = 1510e3 - weightNPerM * heightM
  const input = { heightM, horizontalLoadN, chain: { lengthM: 0, weightNPerM } }

  it('is 300.93 m', () => {
    expect(leastLength(input, 0)).toBeCloseTo(300.93, 2)
  })

  it('has the fairlead tension it was made for, and just lifts', () => {
    const shape = solveRode({ ...input, chain: { lengthM: leastLength(input, 0) ?? 0, weightNPerM } })
    expect(shape.regime).toBe('lifting')
    expect(shape.tensionBowN).toBeCloseTo(1510e3, 3)
  })
})
