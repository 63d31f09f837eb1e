import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ladderPlot, placedHoldings, rowLetter, spread } from '~/utils/chart/ladder'
import { matrixBlocks, matrixRows } from '~/utils/chart/matrix'
import { heldPlaces, placedRows, stripAxis, stripKey } from '~/utils/chart/strips'
import { columnHeader, tableCsv } from '~/utils/chart/table'
import { pullsInWords, withUnit, wrapped } from '~/utils/chart/text'
import type { StripRow } from '~/utils/chart/types'

const strip = (median: number, more: Partial<StripRow> = {}): StripRow =>
  ({ id: 'a', label: 'a', median, low50: median * 0.9, high50: median * 1.1, low90: median * 0.7, high90: median * 1.4, n: 1, pulls: [], ...more })

describe('words in a drawing', () => {
  it('break at spaces, keep a figure with its unit, and lose nothing', () => {
    expect(wrapped('scoop of long name, 20 kg', 12)).toEqual(['scoop of', 'long name,', '20\u00A0kg'])
    fc.assert(fc.property(fc.stringMatching(/^[a-z0-9]{1,9}( [a-z0-9]{1,9}){0,9}$/), text =>
      wrapped(text, 12).join(' ').replaceAll('\u00A0', ' ') === text))
  })

  it('count pulls and keep a unit on the line of its figure', () => {
    expect([0, 1, 12].map(pullsInWords)).toEqual(['no pulls', '1 pull', '12 pulls'])
    expect(withUnit('4.2', 'kN')).toBe('4.2\u00A0kN')
  })
})

describe('a strip chart', () => {
  it('holds firm rows, pulls and load; a thin row’s interval may run out of it', () => {
    const axis = stripAxis([strip(5), strip(4, { dashed: true, low90: 0.01, high90: 900, pulls: [{ value: 60, atLimit: true }] })], 2)
    expect([3.5, 7, 60, 2].some(axis.outside)).toBe(false)
    expect([0.01, 900].every(axis.outside)).toBe(true)
  })

  it('stacks its rows without overlap, each as high as its words need', () => {
    for (const narrow of [true, false]) {
      const placed = placedRows([strip(1, { label: 'word '.repeat(20) }), strip(2)], row => row, { narrow, head: 24, indent: 44 })
      const [first, second] = placed.map(({ at }) => at)
      expect(first && second && second.top === first.top + first.height).toBe(true)
      const lastBaseline = first!.textY + 18 * (first!.label.length - 1)
      expect(lastBaseline).toBeLessThan(narrow ? first!.lineY - 8 : first!.top + first!.height)
      expect(first!.label.length).toBeGreaterThan(2)
    }
  })

  it('joins pulls that never moved at one load, and leaves out arrow and count where the next stands close', () => {
    expect(heldPlaces([50, 10, 50, 12, 12, 50], 400)).toEqual([
      { x: 10, arrow: false, count: null }, { x: 12, arrow: true, count: 2 }, { x: 50, arrow: true, count: 3 },
    ])
    expect(heldPlaces([10, 10, 14], 400)[0]).toEqual({ x: 10, arrow: true, count: null })
  })

  it('explains those marks that it has', () => {
    expect(stripKey([strip(1)]).map(item => item.mark)).toEqual(['interval'])
    expect(stripKey([strip(1, { dashed: true, pulls: [{ value: 1, atLimit: true }] })]).map(item => item.mark)).toEqual(['dashed', 'limit'])
  })
})

describe('a wind ladder', () => {
  const curve = [0, 10, 20, 30, 40].map(wind => ({ wind, load: wind * wind / 100 }))

  it('puts a holding on the curve at its holding wind', () => {
    const rows = [{ label: 'a', holding: 9, wind: 30, atLeast: false }]
    const plot = ladderPlot(curve, rows, 40, 400, 9)
    const [placed] = placedHoldings(plot, rows, 38)
    expect(placed).toMatchObject({ x: 75, y: plot.yOf(9), beyond: false })
    expect(plot.curve).toContain(`75,${placed!.y - 40}`)
  })

  it('keeps far holdings from flattening the curve, and says they lie beyond', () => {
    const rows = [{ label: 'giant', holding: 500, wind: 40, atLeast: true }, { label: 'none', holding: 1, wind: null, atLeast: false }]
    const plot = ladderPlot(curve, rows, 40, 400, 9)
    const [giant, none] = placedHoldings(plot, rows, 38)
    expect(plot.load.high).toBeLessThan(40)
    expect(giant).toMatchObject({ x: null, y: 40, beyond: true })
    expect(none).toMatchObject({ x: null, beyond: false })
  })

  it('spreads words apart inside their space and keeps their order', () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 0, max: 400, noNaN: true }), { minLength: 1, maxLength: 30 }), (wanted) => {
      const places = spread(wanted, 20, 0, 400)
      const room = Math.min(20, 400 / Math.max(wanted.length - 1, 1))
      const sorted = [...places].sort((a, b) => a - b)
      expect(sorted.every((place, index) => place >= 0 && place <= 400 && (index === 0 || place - sorted[index - 1]! >= room - 0.11))).toBe(true)
      for (const [i, y] of wanted.entries()) for (const [j, z] of wanted.entries()) if (y < z) expect(places[i]!).toBeLessThanOrEqual(places[j]!)
    }))
  })

  it('stands without a curve and names many rows', () => {
    expect(ladderPlot([], [], 0, 100, 5).curve).toBe('')
    expect([0, 25, 26].map(rowLetter)).toEqual(['A', 'Z', '27'])
  })
})

describe('a matrix', () => {
  const columns = ['silt', 'shell', 'gravel'].map(label => ({ label }))
  const rows = [{ label: 'Tern', cells: [{ text: '1', level: 1 as const, n: 3 }, null, null] }, { label: 'Merle', cells: [null, null, null] }]

  it('lists figures first and says in words what is missing, where it is narrow', () => {
    const [tern, merle] = matrixBlocks(columns, rows, 'no pulls here')
    expect(tern).toMatchObject({ filled: [0], missing: ['no pulls here: shell, gravel'] })
    expect(merle).toMatchObject({ filled: [], missing: ['no pulls here: silt, shell, gravel'], top: tern!.height })
  })

  it('gives a row the height that its label or its missing words need', () => {
    expect(matrixRows(rows, 40, 22, 5).map(({ top, height }) => [top, height])).toEqual([[40, 94], [134, 94]])
    expect(matrixRows([{ label: 'a '.repeat(40), cells: [] }], 0, 22, 5)[0]?.height).toBeGreaterThan(52)
  })
})

describe('the table of numbers', () => {
  const columns = [{ key: 'label', label: 'Design' }, { key: 'median', label: 'Holding', unit: 'kN' }]

  it('has units in its headers and quotes what must be quoted (RFC 4180)', () => {
    expect(columns.map(columnHeader)).toEqual(['Design', 'Holding (kN)'])
    expect(tableCsv(columns, [{ label: 'Tern, "20 kg"', median: 4.2 }, { label: 'Merle', median: null }])).toBe('Design,Holding (kN)\r\n"Tern, ""20 kg""",4.2\r\nMerle,\r\n')
  })
})
