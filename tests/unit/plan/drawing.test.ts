import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layElevation, narrowSheet, wideSheet } from '~/utils/drawing/elevation'
import type { ElevationInput } from '~/utils/drawing/elevation'
import { lengthOf, resample, splitAt } from '~/utils/drawing/polyline'
import { seabedTiles } from '~/utils/seabedTiles'
import { logScale, roundValues } from '~/utils/scale'
import { brackets, stripOf } from '~/utils/ranking'
import type { RankedRow, RankedSeabed } from '#shared/types/ranking'
import { answerRode } from '#shared/rode/answer'
import { boatTypes } from '#shared/types/words'

const points = fc.array(fc.tuple(fc.double({ min: 0, max: 100, noNaN: true }), fc.double({ min: 0, max: 100, noNaN: true })), { minLength: 2, maxLength: 30 })

describe('a polyline', () => {
  it('is cut without losing length', () => {
    fc.assert(fc.property(points, fc.double({ min: 0, max: 1, noNaN: true }), (line, share) => {
      const whole = lengthOf(line)
      const [before, after] = splitAt(line, share * whole)
      expect(lengthOf(before) + lengthOf(after)).toBeCloseTo(whole, 6)
      expect(lengthOf(before)).toBeCloseTo(share * whole, 6)
    }))
  })

  it('keeps its ends when it is drawn with another count of points', () => {
    fc.assert(fc.property(points, (line) => {
      const drawn = resample(line, 64)
      expect([drawn[0], drawn.at(-1)]).toEqual([line[0], line.at(-1)])
      expect(lengthOf(drawn)).toBeLessThanOrEqual(lengthOf(line) + 1e-6)
      expect(drawn.length).toBeLessThanOrEqual(64)
    }))
  })
})

function input(depthM: number, chainM: number, loadN: number, lengthM: number, type: ElevationInput['boat']['type']): ElevationInput {
  const bowHeightM = 0.06 * lengthM + 0.5
  const heightM = depthM + bowHeightM
  const rode = answerRode({ heightM, horizontalLoadN: loadN, chain: { lengthM: heightM * 1.05 + chainM, diameterMm: 10 } })
  return {
    curve: rode.curve, heightM, waterM: depthM, chainM: heightM * 1.05 + chainM, ropeM: 0, snubberM: 6, groundedM: rode.groundedChainM,
    shankAngleDeg: rode.shankAngleDeg, boat: { type, lengthM, bowHeightM }, seabeds: [{ seabed: 'gravel', share: 0.3 }, { seabed: 'shell', share: 0.7 }],
  }
}

describe('the elevation', () => {
  const plans = fc.tuple(fc.double({ min: 0.5, max: 100, noNaN: true }), fc.double({ min: 0, max: 300, noNaN: true }), fc.double({ min: 10, max: 50_000, noNaN: true }),
    fc.double({ min: 3, max: 60, noNaN: true }), fc.constantFrom(...boatTypes))

  it.each([['wide', wideSheet], ['narrow', narrowSheet]])('is to scale both ways and stays on its %s sheet', (_, sheet) => {
    fc.assert(fc.property(plans, ([depthM, chainM, loadN, lengthM, type]) => {
      const plan = input(depthM, chainM, loadN, lengthM, type)
      const scene = layElevation(plan, sheet)
      const spanM = plan.curve.at(-1)?.[0] ?? 0
      expect(scene.bow[0] - scene.anchor[0]).toBeCloseTo(spanM * scene.scale, 0)
      expect(scene.anchor[1] - scene.bow[1]).toBeCloseTo(plan.heightM * scene.scale, 0)
      expect(scene.bedY - scene.surfaceY).toBeCloseTo(depthM * scene.scale, 0)
      expect(scene.anchor[0]).toBeGreaterThanOrEqual(sheet.margin - 0.1)
      expect(scene.bow[0]).toBeLessThanOrEqual(sheet.width)
      expect(scene.bow[1]).toBeGreaterThan(0)
      expect(scene.height).toBeLessThanOrEqual(sheet.height + sheet.sky)
      expect(scene.bed.reduce((sum, { width }) => sum + width, 0)).toBeCloseTo(sheet.width, 0)
      expect(`${scene.chain}${scene.boat.hull}`).not.toMatch(/NaN|Infinity/)
    }), { numRuns: 200 })
  })
})

describe('seabed patterns', () => {
  it('differ for every seabed, so that colour is never the only sign', () => {
    const tiles = Object.values(seabedTiles).map(({ dots, lines }) => dots + lines)
    expect(new Set(tiles).size).toBe(tiles.length)
    expect(tiles.every(tile => tile.length > 0)).toBe(true)
  })
})

describe('the scale of the strips', () => {
  it('rises from 0 to 100 and holds what lies outside at its ends', () => {
    const at = logScale(100, 10_000)
    expect([at(100), at(1000), at(10_000), at(1), at(1e9)]).toEqual([0, 50, 100, 0, 100])
  })

  it('has round values', () => {
    expect(roundValues(0.7, 12)).toEqual([1, 2, 5, 10])
    expect(roundValues(0.09, 0.3)).toEqual([0.1, 0.2])
    expect(roundValues(0.01, 1000).length).toBeLessThanOrEqual(8)
  })
})

describe('a strip', () => {
  const entry = { holdingN: { median: 4000, low90: 2000, high90: 8000 }, upliftFactor: 0.5 } as RankedSeabed

  it('lies as the rode pulls, the half inside the nine tenths', () => {
    const strip = stripOf(entry)
    expect(strip).toMatchObject({ median: 2000, low90: 1000, high90: 4000 })
    // ln 4 over 2 x 1.645 is the sd, 0.6745 sd the half: 2000 x exp(-0.2842) = 1505
    expect(strip?.low50).toBeCloseTo(1505, -1)
    expect(strip?.high50).toBeCloseTo(2657, -1)
  })
})

describe('brackets', () => {
  it('join rows that are tied, and end where they are not', () => {
    const rows = [true, true, false, false, true, false].map(tiedWithNext => ({ tiedWithNext }) as RankedRow)
    expect(brackets(rows)).toEqual(['start', 'middle', 'end', null, 'start', 'end'])
  })
})
