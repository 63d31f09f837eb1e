import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { csvCell, readCsv, readRecords, writeCsv } from '#shared/utils/csv'

describe('a table as text', () => {
  it('is written as RFC 4180 (section 2) has it', () => {
    expect(writeCsv(['aaa', 'b'], [['b "bb"', 'line\r\nbreak'], ['c,c', null]])).toBe('aaa,b\r\n"b ""bb""","line\r\nbreak"\r\n"c,c",\r\n')
  })

  it('is read as RFC 4180 (section 2) has it, with or without a last line end', () => {
    expect(readCsv('"aaa","b ""bb","ccc"\r\nzzz,yyy,"x\r\nx"')).toEqual([['aaa', 'b "bb', 'ccc'], ['zzz', 'yyy', 'x\r\nx']])
    expect(readCsv('a,\r\n,b\r\n')).toEqual([['a', ''], ['', 'b']])
    expect(readCsv('a\nb\n')).toEqual([['a'], ['b']])
    expect(readCsv('')).toEqual([])
  })

  it('comes back as it went', () => {
    const text = fc.string({ unit: fc.constantFrom('a', '"', ',', '\r', '\n', ' ', 'ø', '\u2028', '=', '\'') })
    const tables = fc.integer({ min: 1, max: 4 }).chain(width => fc.array(fc.array(text, { minLength: width, maxLength: width }), { minLength: 1, maxLength: 6 }))
    fc.assert(fc.property(tables, ([header = [], ...rows]) => {
      expect(readCsv(writeCsv(header, rows))).toEqual([header, ...rows])
    }), { numRuns: 500 })
  })

  it('gives every number back exactly', () => {
    fc.assert(fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
      expect(Number(csvCell(value))).toBe(value === 0 ? 0 : value)
    }))
    expect(csvCell(-0)).toBe('0')
  })

  it('has no place for what is not a number', () => {
    for (const value of [Number.NaN, Infinity, -Infinity]) expect(() => csvCell(value)).toThrow(RangeError)
  })

  it('names the line that is no table', () => {
    expect(() => readCsv('a,b\r\n1\r\n')).toThrow('line 2 of the table must have 2 cells, got 1')
    expect(() => readCsv('a,b\r\n1,"2\r\n')).toThrow('line 2')
    expect(() => readCsv('a\r\nb"c\r\n')).toThrow('line 2')
  })

  it('is read under the names of its header', () => {
    expect(readRecords('a,b\r\n1,\r\n')).toEqual([{ a: '1', b: '' }])
  })
})
