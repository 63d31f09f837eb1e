import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { ReadPull } from '#shared/types/reading'
import { addressOf, massOf, readChoices, textOf, wholeOf, wordOf } from '~/utils/reading/choices'
import { pairsOf } from '~/utils/reading/pairs'
import { dayInWords, listed } from '~/utils/reading/words'

const readers = { family: wordOf(['claw', 'other'] as const), page: wholeOf(1, 1000), mass: massOf('asAtSea'), search: textOf(20) }

describe('readChoices', () => {
  it('reads what it knows and names what it does not', () => {
    const { values, typed, ignored } = readChoices({ family: 'claw', page: '0', mass: '33 lb', search: 'x'.repeat(21), other: '1' }, readers)
    expect(values).toEqual({ family: 'claw', mass: 14.969 })
    expect(typed).toEqual({ family: 'claw', mass: '33 lb' })
    expect(ignored.map(({ key }) => key)).toEqual(['page', 'search'])
  })

  it('takes a blank as no choice, and the last of several', () => {
    expect(readChoices({ family: '', mass: ' ', page: ['3', '4'] }, readers)).toEqual({ values: { page: 4 }, typed: { page: '4' }, ignored: [] })
  })

  it('never fails, and never lets through what it does not know', () => {
    fc.assert(fc.property(fc.dictionary(fc.constantFrom('family', 'page', 'mass', 'search', '__proto__', 'constructor'), fc.oneof(fc.string(), fc.constant(null), fc.array(fc.string()))), (query) => {
      const { values } = readChoices(query, readers)
      if (values.family !== undefined) expect(['claw', 'other']).toContain(values.family)
      if (values.page !== undefined) expect(Number.isInteger(values.page) && values.page >= 1 && values.page <= 1000).toBe(true)
      if (values.mass !== undefined) expect(values.mass >= 0.5 && values.mass <= 2000).toBe(true)
    }))
  })
})

describe('addressOf', () => {
  it('writes only what says something, escaped', () => {
    expect(addressOf('/designs', { search: 'a&b=c', family: undefined, mass: '', page: 2 })).toBe('/designs?search=a%26b%3Dc&page=2')
    expect(addressOf('/designs', {})).toBe('/designs')
  })
})

describe('pairsOf', () => {
  const pull = (ordinal: number, pair: string | null, modified: boolean, more: Partial<ReadPull> = {}) => ({
    id: ordinal, ordinal, pair, design: 'ulvesk', name: 'Ulvesk', massKg: 20, seabed: 'firm-mud', supersededBy: null, modification: modified ? { slug: 'm', name: 'M' } : null, ...more,
  }) as ReadPull

  it('sets the modified beside the unmodified', () => {
    const [first, ...rest] = pairsOf([pull(1, 'p', true), pull(2, 'p', false), pull(3, null, false), pull(4, 'q', true)])
    expect(rest).toEqual([])
    expect([first?.plain.map(({ ordinal }) => ordinal), first?.modified.map(({ ordinal }) => ordinal)]).toEqual([[2], [1]])
  })

  it('leaves out what was corrected', () => {
    expect(pairsOf([pull(1, 'p', true), pull(2, 'p', false, { supersededBy: 3 })])).toEqual([])
  })
})

describe('words', () => {
  it('lists and dates', () => {
    expect([listed([]), listed(['a']), listed(['a', 'b', 'c'])]).toEqual(['', 'a', 'a, b and c'])
    expect(dayInWords('2024-09-04')).toBe('4 September 2024')
  })
})
