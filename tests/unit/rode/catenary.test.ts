import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { solveRode, type RodeInput, type RodeShape } from '#shared/rode/catenary'
import { rodeCurve } from '#shared/rode/curve'
import type { FieldError } from '#shared/utils/fieldError'
import { integratePart } from './quadrature'

const decades = (low: number, high: number) =>
  fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp)
const weight = fc.oneof({ weight: 1, arbitrary: fc.constant(0) }, { weight: 6, arbitrary: decades(1e-4, 300) })

/** Any valid rode: from one part in 1e9 longer than the height to a thousand times it, chain and rope in any share. */
const anyRode: fc.Arbitrary<RodeInput> = fc.record({
  heightM: decades(0.3, 200),
  spare: decades(1e-9, 1000),
  ropeShare: fc.oneof(fc.constant(0), fc.constant(1), fc.double({ min: 0.001, max: 0.999, noNaN: true })),
  chainWeight: weight,
  ropeWeight: weight,
  horizontalLoadN: decades(1e-3, 1e6),
}).map(({ heightM, spare, ropeShare, chainWeight, ropeWeight, horizontalLoadN }) => {
  const lengthM = heightM * (1 + spare)
  const chain = { lengthM: lengthM * (1 - ropeShare), weightNPerM: chainWeight }
  return { heightM, horizontalLoadN, chain, ...(ropeShare > 0 ? { rope: { lengthM: lengthM * ropeShare, weightNPerM: ropeWeight } } : {}) }
}).filter(rode => rode.chain.lengthM + (rode.rope?.lengthM ?? 0) > rode.heightM)

/** Greatest relative error of a shape against statics and against the integrated line. */
function residual(rode: RodeInput, shape: RodeShape): number {
  const { heightM, horizontalLoadN: loadN, chain } = rode
  const rope = rode.rope ?? { lengthM: 0, weightNPerM: 0 }
  const { verticalAnchorN, verticalJoinN: joinN, verticalBowN: bowN } = shape
  // What hangs carries its own weight: of a lying part that says the hanging length to its last digit.
  const chainM = shape.groundedChainM > 0 ? (joinN - verticalAnchorN) / Math.max(chain.weightNPerM, 1e-300) : chain.lengthM
  const ropeM = shape.groundedRopeM > 0 ? (bowN - joinN) / rope.weightNPerM : rope.lengthM
  const low = integratePart(chainM, chain.weightNPerM, verticalAnchorN, loadN)
  const high = integratePart(ropeM, rope.weightNPerM, joinN, loadN)
  const groundedM = shape.groundedChainM + shape.groundedRopeM
  const errors = [
    (low.riseM + high.riseM) / heightM - 1,
    (groundedM + low.spanM + high.spanM) / shape.spanM - 1,
    (chainM + shape.groundedChainM - chain.lengthM) / (chain.lengthM + heightM),
    (ropeM + shape.groundedRopeM - rope.lengthM) / (rope.lengthM + heightM),
    (verticalAnchorN + chain.weightNPerM * chainM - joinN) / Math.max(loadN, joinN),
    (joinN + rope.weightNPerM * ropeM - bowN) / Math.max(loadN, bowN),
    shape.tensionAnchorN / Math.hypot(loadN, verticalAnchorN) - 1,
    shape.tensionJoinN / Math.hypot(loadN, joinN) - 1,
    shape.tensionBowN / Math.hypot(loadN, bowN) - 1,
    shape.shankAngleRad - Math.atan(verticalAnchorN / loadN),
  ]
  return Math.max(...errors.map(Math.abs))
}

describe('solveRode', () => {
  it('holds its own equations to 1e-9 over 10 000 rodes of every kind', () => {
    const seen = { grounded: 0, lifting: 0, clear: 0, ropeOnBottom: 0, taut: 0, slack: 0, weightless: 0 }
    fc.assert(fc.property(anyRode, (rode) => {
      const shape = solveRode(rode)
      seen[shape.regime] += 1
      if (shape.groundedRopeM > 0) seen.ropeOnBottom += 1
      if (shape.spanM < 0.01 * rode.heightM) seen.taut += 1
      if (shape.groundedChainM > 100 * rode.heightM) seen.slack += 1
      if (rode.rope?.weightNPerM === 0) seen.weightless += 1
      expect(residual(rode, shape)).toBeLessThanOrEqual(1e-9)
      expect(shape.groundedChainM).toBeGreaterThanOrEqual(0)
      expect(shape.groundedRopeM).toBeGreaterThanOrEqual(0)
      if (shape.regime === 'clear') expect(shape.groundedChainM + shape.groundedRopeM).toBe(0)
      else expect(shape.shankAngleRad).toBe(0)
    }), { numRuns: 10_000, seed: 20_190 })
    for (const kind of ['grounded', 'clear', 'ropeOnBottom', 'taut', 'slack', 'weightless'] as const) {
      expect(seen[kind], kind).toBeGreaterThan(100)
    }
  }, 60_000)

  it('never raises the shank angle with more rode', () => {
    fc.assert(fc.property(anyRode, fc.boolean(), decades(1e-6, 10), (rode, ropeToo, more) => {
      const longer = { ...rode, chain: { ...rode.chain, lengthM: rode.chain.lengthM * (1 + more) } }
      if (rode.rope && ropeToo) longer.rope = { ...rode.rope, lengthM: rode.rope.lengthM * (1 + more) }
      const before = solveRode(rode).shankAngleRad
      expect(solveRode(longer).shankAngleRad).toBeLessThanOrEqual(before * (1 + 1e-9) + 1e-12)
    }), { numRuns: 5000, seed: 20_191 })
  })

  it('never lowers the shank angle with more load', () => {
    fc.assert(fc.property(anyRode, decades(1e-6, 10), (rode, more) => {
      const before = solveRode(rode).shankAngleRad
      const after = solveRode({ ...rode, horizontalLoadN: rode.horizontalLoadN * (1 + more) }).shankAngleRad
      expect(after).toBeGreaterThanOrEqual(before * (1 - 1e-9) - 1e-12)
    }), { numRuns: 5000, seed: 20_192 })
  })

  it('is a straight line for a rode without weight', () => {
    const shape = solveRode({ heightM: 3, horizontalLoadN: 400, chain: { lengthM: 0, weightNPerM: 0 }, rope: { lengthM: 5, weightNPerM: 0 } })
    expect(shape.spanM).toBeCloseTo(4, 12)
    expect(shape.verticalBowN).toBeCloseTo(300, 9)
    expect(shape.shankAngleRad).toBe(shape.bowAngleRad)
  })

  const good: RodeInput = { heightM: 10, horizontalLoadN: 1000, chain: { lengthM: 40, weightNPerM: 11.9 } }

  it.each<[string, string, RegExp, RodeInput]>([
    ['rode as long as the height', 'chain.lengthM', /too short to reach the bottom/, { ...good, chain: { lengthM: 10, weightNPerM: 11.9 } }],
    ['short rope', 'rope.lengthM', /too short to reach the bottom/, { ...good, chain: { lengthM: 2, weightNPerM: 11.9 }, rope: { lengthM: 7, weightNPerM: 0 } }],
    ['no load', 'horizontalLoadN', /0.000001 to 1000000000, got 0/, { ...good, horizontalLoadN: 0 }],
    ['a load that is no number', 'horizontalLoadN', /got NaN/, { ...good, horizontalLoadN: Number.NaN }],
    ['no height', 'heightM', /got 0/, { ...good, heightM: 0 }],
    ['negative chain', 'chain.lengthM', /got -1/, { ...good, chain: { lengthM: -1, weightNPerM: 1 } }],
    ['negative weight', 'chain.submergedWeightNPerM', /got -1/, { ...good, chain: { lengthM: 40, weightNPerM: -1 } }],
    ['floating rope', 'rope.submergedWeightNPerM', /got -0.1/, { ...good, rope: { lengthM: 40, weightNPerM: -0.1 } }],
    ['endless rope', 'rope.lengthM', /got Infinity/, { ...good, rope: { lengthM: Number.POSITIVE_INFINITY, weightNPerM: 0 } }],
  ])('refuses %s', (_name, field, message, rode) => {
    expect(() => solveRode(rode)).toThrow(RangeError)
    expect(() => solveRode(rode)).toThrow(message)
    expect(() => solveRode(rode)).toThrow(expect.objectContaining<Partial<FieldError>>({ field }))
  })
})

describe('rodeCurve', () => {
  it('runs from the anchor to the bow, never down, and as long as the rode', () => {
    fc.assert(fc.property(anyRode, (rode) => {
      const shape = solveRode(rode)
      const curve = rodeCurve(rode, shape)
      expect(curve[0]).toEqual([0, 0])
      expect(curve.at(-1)).toEqual([shape.spanM, rode.heightM])
      let lengthM = 0
      curve.slice(1).forEach(([x, y], index) => {
        const [x0, y0] = curve[index] ?? [0, 0]
        if (x < x0 - 1e-9 * shape.spanM || y < y0 - 1e-9 * rode.heightM) expect.fail(`turns back at [${x}, ${y}]`)
        lengthM += Math.hypot(x - x0, y - y0)
      })
      const wholeM = rode.chain.lengthM + (rode.rope?.lengthM ?? 0)
      expect(lengthM).toBeLessThanOrEqual(wholeM * (1 + 1e-9))
      expect(lengthM).toBeGreaterThan(wholeM * 0.96)
    }), { numRuns: 1000, seed: 20_193 })
  })

  it('refuses cuts that are no whole number', () => {
    const rode = { heightM: 1, horizontalLoadN: 1, chain: { lengthM: 2, weightNPerM: 1 } }
    expect(() => rodeCurve(rode, solveRode(rode), 1.5)).toThrow(RangeError)
  })
})
