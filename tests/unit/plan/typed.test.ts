import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readQuery, writeQuery } from '~/utils/plan/typed'
import { addBed, removeBed } from '~/utils/plan/rebalance'
import { readMix } from '~/utils/plan/shares'
import { choiceKeys, choiceWords, quantityKeys } from '~/utils/plan/words'
import { seabeds } from '#shared/types/words'

const sum = (beds: { share: string }[]) => beds.reduce((total, { share }) => total + Number.parseInt(share), 0)

describe('the address of a plan', () => {
  it('says the starting sentence where it is empty', () => {
    const plan = readQuery({})
    expect(plan.words.length).toBe('11.2 m')
    expect(plan.choices.blow).toBe('gust')
    expect(plan.beds.map(({ seabed }) => seabed)).toEqual(['sandy-mud', 'loose-sand'])
  })

  it('carries every word as typed', () => {
    const word = fc.string({ maxLength: 40 }).map(text => text.trim())
    fc.assert(fc.property(fc.record(Object.fromEntries(quantityKeys.map(key => [key, word]))), fc.subarray([...seabeds], { minLength: 1, maxLength: 5 }), (words, beds) => {
      const plan = { ...readQuery({}), beds: beds.map(seabed => ({ seabed, share: '20 %' })), own: 'some-design' }
      Object.assign(plan.words, words)
      plan.choices.swell = 'open'
      expect(readQuery(writeQuery(plan))).toEqual(plan)
    }), { numRuns: 200 })
  })

  it('keeps a blank blank, and takes the last of several', () => {
    expect(readQuery({ snubber: '' }).words.snubber).toBe('')
    expect(readQuery({ wind: ['30 kn', '42 kn'] }).words.wind).toBe('42 kn')
  })

  it('takes nothing that is not in its lists', () => {
    const plan = readQuery({ type: 'submarine', swell: '__proto__', bed: ['lava', 'gravel'], share: ['50 %', '100 %'], own: '<script>', order: 'toString' })
    for (const key of choiceKeys) expect(Object.keys(choiceWords[key].options)).toContain(plan.choices[key])
    expect(plan.choices.type).toBe('sailMonohull')
    expect(plan.beds).toEqual([{ seabed: 'gravel', share: '100 %' }])
    expect(plan.own).toBe('script')
  })
})

describe('shares of a mix', () => {
  it('are equal where none is typed, and blanks split what is left', () => {
    const beds = [{ seabed: 'gravel', share: '' }, { seabed: 'shell', share: '50 %' }, { seabed: 'silt', share: '' }] as const
    expect(readMix(beds, 'metric').mix.map(({ share }) => share)).toEqual([0.25, 0.5, 0.25])
    expect(readMix(beds.map(bed => ({ ...bed, share: '' })), 'metric').mix[0]?.share).toBeCloseTo(1 / 3, 12)
  })

  it.each([
    ['too much', [['gravel', '80 %'], ['shell', '40 %']], /come to 120 %/],
    ['too little', [['gravel', '30 %'], ['shell', '40 %']], /come to 70 %/],
    ['nothing left', [['gravel', '100 %'], ['shell', '']], /leave nothing/],
    ['twice', [['gravel', '50 %'], ['gravel', '50 %']], /twice/],
    ['none', [], /at least one/],
    ['no share', [['gravel', 'much'], ['shell', '']], /./],
  ] as const)('refuse %s', (_, rows, message) => {
    const beds = rows.map(([seabed, share]) => ({ seabed, share }))
    expect(readMix(beds, 'metric').errors[0]?.message).toMatch(message)
  })

  it('still add up to 100 % as seabeds come and go', () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 0, max: 3 }), { maxLength: 12 }), (steps) => {
      let beds = readQuery({}).beds
      for (const step of steps) {
        const next = seabeds.find(seabed => !beds.some(bed => bed.seabed === seabed))
        if (step > 0 && beds.length < 5 && next) beds = addBed(beds, next, 'metric')
        else if (beds.length > 1) beds = removeBed(beds, step % beds.length, 'metric')
        if (beds.length > 1) expect(sum(beds)).toBe(100)
        expect(readMix(beds, 'metric').errors).toEqual([])
      }
    }))
  })
})
