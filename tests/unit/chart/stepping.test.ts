import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { placeAfter } from '~/utils/chart/stepping'
import type { ChartPlace } from '~/utils/chart/stepping'

const walk = (keys: readonly string[], marks: readonly number[], keep = false) =>
  keys.reduce<ChartPlace | null>((place, key) => placeAfter(key, place, marks, keep) ?? null, null)

describe('stepping through a chart', () => {
  it('enters at the first row going down and at the last going up', () => {
    expect(walk(['ArrowDown'], [2, 0])).toEqual({ row: 0, mark: -1 })
    expect(walk(['ArrowUp'], [2, 0])).toEqual({ row: 1, mark: -1 })
    expect(walk(['ArrowRight'], [2, 0])).toEqual({ row: 0, mark: -1 })
  })

  it('goes through the marks of a row and back to the row itself, and stops at both ends', () => {
    expect(walk(['ArrowDown', 'ArrowRight', 'ArrowRight', 'ArrowRight'], [2])).toEqual({ row: 0, mark: 1 })
    expect(walk(['ArrowDown', 'ArrowRight', 'ArrowLeft', 'ArrowLeft'], [2])).toEqual({ row: 0, mark: -1 })
    expect(walk(['ArrowDown', 'ArrowDown', 'ArrowDown'], [2, 0])).toEqual({ row: 1, mark: -1 })
  })

  it('leaves the mark when the row changes, or keeps the column in a table', () => {
    expect(walk(['ArrowDown', 'ArrowRight', 'ArrowDown'], [2, 2])).toEqual({ row: 1, mark: -1 })
    expect(walk(['ArrowDown', 'ArrowRight', 'ArrowDown'], [2, 2], true)).toEqual({ row: 1, mark: 0 })
  })

  it('leaves other keys to the page, and every key where there is nothing', () => {
    expect(placeAfter('Tab', { row: 0, mark: -1 }, [1])).toBeUndefined()
    expect(placeAfter('ArrowDown', null, [])).toBeUndefined()
    expect(placeAfter('Escape', { row: 0, mark: 0 }, [1])).toBeNull()
  })

  it('never leaves the rows and marks that are there', () => {
    const keys = fc.array(fc.constantFrom('ArrowDown', 'ArrowUp', 'ArrowLeft', 'ArrowRight', 'Home', 'End', 'Escape'), { maxLength: 40 })
    fc.assert(fc.property(keys, fc.array(fc.nat(5), { minLength: 1, maxLength: 6 }), (pressed, marks) => {
      const place = walk(pressed, marks)
      expect(place === null || (place.row in marks && place.mark >= -1 && place.mark < (marks[place.row] ?? 0))).toBe(true)
    }))
  })
})
