import { describe, expect, it } from 'vitest'
import { randomStream } from '../../../seed/world/random'

describe('randomStream', () => {
  it('gives the same numbers for the same key and others for another', () => {
    const draw = (key: string) => Array.from({ length: 20 }, ((r: () => number) => () => r())(randomStream(key).uniform))
    expect(draw('a/1')).toEqual(draw('a/1'))
    expect(draw('a/1')).not.toEqual(draw('a/2'))
  })

  it('is uniform over keys as well as along a stream: 20 bins, chi squared with 19 degrees of freedom under 43.8 (p = 0.001)', () => {
    const along = randomStream('along')
    for (const draw of [() => along.uniform(), ((i: number) => () => randomStream(`key/${i++}`).uniform())(0)]) {
      const bins = new Array<number>(20).fill(0)
      for (let i = 0; i < 20_000; i++) {
        const bin = Math.floor(draw() * 20)
        bins[bin] = (bins[bin] ?? 0) + 1
      }
      expect(bins.reduce((sum, n) => sum + (n - 1000) ** 2 / 1000, 0)).toBeLessThan(43.8)
    }
  })

  it('has normals of mean 0, sd 1, and 5 % beyond 1.96', () => {
    const random = randomStream('normal')
    const draws = Array.from({ length: 40_000 }, () => random.normal())
    const mean = draws.reduce((sum, x) => sum + x, 0) / draws.length
    const sd = Math.sqrt(draws.reduce((sum, x) => sum + (x - mean) ** 2, 0) / draws.length)
    expect(Math.abs(mean)).toBeLessThan(0.02)
    expect(Math.abs(sd - 1)).toBeLessThan(0.015)
    expect(draws.filter(x => Math.abs(x) > 1.96).length / draws.length).toBeCloseTo(0.05, 2)
  })

  it('shuffles without loss and picks every item', () => {
    const random = randomStream('shuffle')
    const items = ['a', 'b', 'c', 'd']
    expect(random.shuffle(items).sort()).toEqual(items)
    expect(new Set(Array.from({ length: 200 }, () => random.pick(items))).size).toBe(4)
    expect(() => random.pick([])).toThrow(RangeError)
  })
})
