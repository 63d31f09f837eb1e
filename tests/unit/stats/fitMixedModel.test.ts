import { describe, expect, it } from 'vitest'
import { evidenceGradient } from '#shared/stats/evidenceGradient'
import { logEvidence } from '#shared/stats/evidence'
import { fitMixedModel } from '#shared/stats/fitMixedModel'
import { makeLaplace } from '#shared/stats/laplace'
import { maximise, numericGradient } from '#shared/stats/maximise'
import type { MixedModel } from '#shared/stats/mixedModel'
import { randomNumbers } from '../../factories/randomNumbers'

/** Groups of observations about their own effects, with days; some open above. */
function example(width: number, open: number): MixedModel {
  const random = randomNumbers(9)
  const [n, cols] = [60, 6]
  const effect = Float64Array.from({ length: cols }, () => 0.5 * random.normal())
  const y = Float64Array.from({ length: n }, (_, i) => effect[i % cols]! + 0.3 * random.normal())
  return {
    lo: y.map(value => value - width / 2),
    hi: y.map(value => (random.uniform() < open ? Infinity : value + width / 2)),
    rowStart: Int32Array.from({ length: n + 1 }, (_, i) => i),
    cols: Int32Array.from({ length: n }, (_, i) => i % cols),
    coefs: new Float64Array(n).fill(1),
    group: new Int32Array(cols),
    priorSd: new Float64Array(cols).fill(NaN),
    day: Int32Array.from({ length: n }, (_, i) => i >> 2),
    days: 15,
    dayGroup: 1,
    groups: 2,
    sdScale: Float64Array.of(0.5, 0.5),
    sigmaScale: 1,
    maximised: new Uint8Array(cols),
  }
}

describe('the mixed model', () => {
  it('has the closed form of a normal model where values are exact and sds known', () => {
    const model = { ...example(1e-7, 0), day: new Int32Array(60).fill(-1), days: 0, dayGroup: -1, groups: 1, sdScale: Float64Array.of(0.5) }
    const [sd, sigma] = [0.5, 0.3]
    const fit = fitMixedModel(model, [[{ cols: [2], unseen: [] }]], { sds: [sd, sigma] })
    const own = Array.from(model.lo).filter((_, i) => i % 6 === 2).map(lo => lo + 0.5e-7)
    const precision = own.length / sigma ** 2 + 1 / sd ** 2
    expect(fit.moments[0]!.mean[0]).toBeCloseTo(own.reduce((sum, y) => sum + y, 0) / sigma ** 2 / precision, 8)
    expect(fit.moments[0]!.covariance[0]).toBeCloseTo(1 / precision, 10)
  })

  it('has an evidence whose gradient agrees with differences', () => {
    const laplace = makeLaplace(example(0.4, 0.3))
    const at = Float64Array.of(-1, -1.7, -1.1)
    const difference = numericGradient(where => logEvidence(laplace, where))(at)
    logEvidence(laplace, at)
    evidenceGradient(laplace, at).forEach((slope, k) => expect(slope).toBeCloseTo(difference[k]!, 4))
  })

  it('widens an unseen effect by its group', () => {
    const fit = fitMixedModel(example(0.4, 0.3), [[
      { cols: [0], unseen: [] }, { cols: [0], unseen: [{ id: 1, group: 0, knownSd: 0 }] }, { cols: [], unseen: [{ id: 1, group: -1, knownSd: 0.5 }] },
    ]], { sds: [0.4, 0.1, 0.3] })
    const cov = fit.moments[0]!.covariance
    expect(cov[4]).toBeCloseTo(cov[0]! + 0.16, 12)
    expect(cov[1]).toBeCloseTo(cov[0]!, 12)
    expect(cov[8]).toBeCloseTo(0.25, 12)
  })

  it('refuses a malformed model by name', () => {
    const model = example(0.4, 0)
    expect(() => fitMixedModel({ ...model, hi: model.lo }, [])).toThrow(/observation 0 must have lo < hi/)
    expect(() => fitMixedModel({ ...model, cols: model.cols.map(col => col + 9) }, [])).toThrow(/must rise and be between 0 and 5, got 9/)
    expect(() => fitMixedModel({ ...model, sdScale: Float64Array.of(1) }, [])).toThrow(/sdScale must have 2 entries, got 1/)
  })
})

describe('the search for a maximum', () => {
  const box = { lower: Float64Array.of(-3, -3), upper: Float64Array.of(3, 3) }

  it('finds the top of a bent ridge (Rosenbrock)', () => {
    const f = (at: Float64Array): number => -((1 - at[0]!) ** 2) - 100 * (at[1]! - at[0]! ** 2) ** 2
    const { at } = maximise(f, numericGradient(f), Float64Array.of(-1.2, 1), box, 1e-5)
    expect(at[0]).toBeCloseTo(1, 3)
    expect(at[1]).toBeCloseTo(1, 3)
  })

  it('stops at the wall of its box', () => {
    const f = (at: Float64Array): number => at[0]! - (at[1]! - 0.5) ** 2
    const { at } = maximise(f, numericGradient(f), Float64Array.of(0, 0), box)
    expect(at[0]).toBe(3)
    expect(at[1]).toBeCloseTo(0.5, 4)
  })
})
