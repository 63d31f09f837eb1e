import { describe, expect, it } from 'vitest'
import { emptyTerms, intervalTerms } from '#shared/stats/intervalTerms'

const at = (lo: number, hi: number, mean: number, scale: number) => {
  const out = intervalTerms((lo - mean) / scale, (hi - mean) / scale, emptyTerms())
  return {
    log: out.log, d1: out.d1 / scale, d2: out.d2 / scale ** 2, d3: out.d3 / scale ** 3, byScale: out.dLogScale,
    byScaleTwice: out.d2LogScale, d1ByScale: (out.d1ByLogScale - out.d1) / scale, d2ByScale: (out.d2ByLogScale - 2 * out.d2) / scale ** 2,
  }
}

const cases: readonly (readonly [string, number, number])[] = [
  ['across the mean', -0.3, 0.5], ['above', 0.4, 0.6], ['far above', 8, 8.3], ['open above', 0.7, Infinity],
  ['open below', -Infinity, -0.2], ['far and open', 130, Infinity], ['far and open below', -Infinity, -130], ['narrow', 0.1, 0.1001],
]

describe('ln of the chance of an interval', () => {
  it.each([
    [-1, 0.5, -0.6295956325528638], [20, 21, -203.91715537228816], [35, Infinity, -616.9751012619225], [0.2, 0.3, -3.253164190574811],
  ])('is right from %d to %d (R 4.2.2 pnorm)', (a, b, expected) => {
    expect(Math.abs(intervalTerms(a, b, emptyTerms()).log / expected - 1)).toBeLessThan(1e-13)
    expect(Math.abs(intervalTerms(-b, -a, emptyTerms()).log / expected - 1)).toBeLessThan(1e-13)
  })

  it.each(cases)('has derivatives that agree with differences: %s', (_, lo, hi) => {
    const [mean, scale, h] = [0.05, 0.6, 1e-4]
    const here = at(lo, hi, mean, scale)
    const [up, down] = [at(lo, hi, mean + h, scale), at(lo, hi, mean - h, scale)]
    const [wide, thin] = [at(lo, hi, mean, scale * Math.exp(h)), at(lo, hi, mean, scale * Math.exp(-h))]
    const close = (value: number, a: number, b: number): void => {
      const difference = (a - b) / (2 * h)
      expect(Math.abs(value - difference)).toBeLessThan(1e-4 * (1 + Math.abs(difference)))
    }
    close(here.d1, up.log, down.log)
    close(here.d2, up.d1, down.d1)
    close(here.d3, up.d2, down.d2)
    close(here.byScale, wide.log, thin.log)
    close(here.byScaleTwice, wide.byScale, thin.byScale)
    close(here.d1ByScale, wide.d1, thin.d1)
    close(here.d2ByScale, wide.d2, thin.d2)
  })

  it('joins smoothly where it changes method', () => {
    const step = (a: number, b: number) => intervalTerms(a, b, emptyTerms())
    expect(step(0.3, 0.3 + 0.99e-5).d1).toBeCloseTo(step(0.3, 0.3 + 1.01e-5).d1, 6)
    expect(step(99.999, Infinity).d2).toBeCloseTo(step(100.001, Infinity).d2, 7)
  })

  it('says nothing of an interval open at both ends', () => {
    expect(intervalTerms(-Infinity, Infinity, emptyTerms())).toEqual(emptyTerms())
  })

  it('refuses ends that do not rise', () => {
    expect(() => intervalTerms(1, 1, emptyTerms())).toThrow(/interval ends must rise, got 1 to 1/)
    expect(() => intervalTerms(NaN, 1, emptyTerms())).toThrow(RangeError)
  })
})
