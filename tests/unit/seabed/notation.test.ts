import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { readChartNotation } from '#shared/seabed/notation'
import { nouns, qualifiers, sandOnly } from '#shared/seabed/notationTables'
import { layersInWords, writeChartNotation } from '#shared/seabed/notationText'
import { seabedFacts } from '#shared/seabed/seabeds'
import { protectedCaution } from '#shared/seabed/cautions'
import { seabeds } from '#shared/types/words'

describe('readChartNotation', () => {
  it('takes the longest abbreviation, upper and lower case apart', () => {
    const words = (text: string) => layersInWords(readChartNotation(text).layers)
    expect(words('caS')).toBe('calcareous sand')
    expect(words('cS')).toBe('coarse sand')
    expect(words('Si')).toBe('silt')
    expect(words('syM')).toBe('sticky mud')
    expect(words('Cb/S')).toBe('cobbles over sand')
    expect(words('ccaS')).toBe('coarse calcareous sand')
    expect(words('S.M.Sh.Wd')).toBe('sand with mud, shells and weed')
    expect(words(' fS / M ')).toBe('fine sand over mud')
    expect(words('')).toBe('')
  })

  it.each([
    ['xS', [{ text: 'x', at: 0 }]], ['fM', [{ text: 'f', at: 0 }]], ['S.', [{ text: '.', at: 1 }]], ['/M', [{ text: '/', at: 0 }]],
    ['S//M', [{ text: '/', at: 2 }]], ['SM', [{ text: 'M', at: 1 }]], ['mud', [{ text: 'mud', at: 0 }]], ['S.f', [{ text: '.f', at: 1 }]],
    ['bkbkSh', [{ text: 'bk', at: 2 }]], ['S.?.M', [{ text: '?.', at: 2 }]], ['wd', [{ text: 'wd', at: 0 }]], ['S 🐟', [{ text: '🐟', at: 2 }]],
  ])('names what it cannot read in %s with its place', (text, unread) => {
    expect(readChartNotation(text).unread).toEqual(unread)
  })

  it('proposes nothing where nothing was read, and says when the reading is partial', () => {
    expect(readChartNotation('')).toEqual({ layers: [], seabed: null, alternatives: [], cautions: [], unread: [] })
    expect(readChartNotation('mud')).toMatchObject({ layers: [], seabed: null })
    expect(readChartNotation('xS').cautions[0]).toContain('could not be read')
  })
})

// What the notation is taken for is this program's own choice, said on its method page.
describe('the proposal', () => {
  it.each([
    ['S.M', 'sandy-mud', []], ['M.S', 'sandy-mud', []], ['fS.M.Sh', 'sandy-mud', []],
    ['S', 'loose-sand', ['hard-sand']], ['fS', 'loose-sand', ['hard-sand']], ['hS', 'hard-sand', []], ['soS', 'loose-sand', []],
    ['M', 'soft-mud', ['firm-mud']], ['sfM', 'firm-mud', []], ['soM', 'soft-mud', []], ['Cy', 'firm-mud', ['stiff-clay']], ['sfCy', 'stiff-clay', []], ['Si', 'silt', []],
    ['Cb/S', 'cobble-over-sand', ['gravel']], ['P/S', 'cobble-over-sand', ['gravel']], ['Cb.S', 'cobble-over-sand', ['gravel']], ['P.S', 'cobble-over-sand', ['gravel']],
    ['G', 'gravel', []], ['P', 'gravel', []], ['Cb', 'cobble-over-sand', ['gravel']], ['Sh', 'shell', []], ['bkSh', 'shell', []],
    ['Wd.S', 'weed-over-sand', ['thick-weed']], ['S.Wd', 'weed-over-sand', ['thick-weed']], ['Wd/S', 'weed-over-sand', ['thick-weed']],
    ['Wd.M', 'weed-over-mud', ['thick-weed']], ['Wd/Si', 'weed-over-mud', ['thick-weed']], ['Wd', 'thick-weed', []],
    ['Sg', 'seagrass', []], ['S.Sg', 'seagrass', ['loose-sand', 'hard-sand']], ['R', 'rock', []], ['Bo', 'rock', []], ['Co', 'coral', []],
    ['S/M', 'loose-sand', ['hard-sand']], ['M/S', 'soft-mud', ['firm-mud']], ['S/R', 'thin-sand', ['loose-sand', 'hard-sand']], ['S.R', 'rock', ['loose-sand', 'hard-sand']],
    ['S.Sh', 'loose-sand', ['hard-sand', 'shell']], ['S.G', 'loose-sand', ['hard-sand', 'gravel']],
  ])('for %s is %s', (text, seabed, alternatives) => {
    expect(readChartNotation(text)).toMatchObject({ seabed, alternatives, unread: [] })
  })

  it('warns of layers, mixtures, choices, calcareous sand and protected bottoms', () => {
    const cautions = (text: string) => readChartNotation(text).cautions.join(' ')
    expect(cautions('S/M')).toContain('Layers: sand over mud. The upper one is taken')
    expect(cautions('S')).toBe('Taken as loose sand, the worse; it may also be hard sand.')
    expect(cautions('S.M')).toContain('shares are for you to say')
    expect(cautions('fS.M.Sh')).toContain('first two materials')
    expect(cautions('caS')).toContain('Calcareous')
    expect(cautions('M/Sg')).toContain(protectedCaution)
    expect(cautions('R')).toContain('No holding figure')
    expect(cautions('G')).toBe('')
  })
})

describe('writing', () => {
  const constituent = fc.constantFrom(...nouns).chain(noun => fc.record({
    noun: fc.constant(noun.word),
    qualifiers: fc.subarray(qualifiers.map(({ word }) => word).filter(word => noun.word === 'sand' || !sandOnly.has(word))),
  }))
  const layers = fc.array(fc.array(constituent, { minLength: 1, maxLength: 4 }), { minLength: 1, maxLength: 3 })

  it('is read back as it was', () => {
    fc.assert(fc.property(layers, (written) => {
      const answer = readChartNotation(writeChartNotation(written))
      expect(answer.unread).toEqual([])
      expect(answer.layers.map(layer => layer.map(({ noun, qualifiers: said }) => ({ noun, qualifiers: said })))).toEqual(written)
    }), { numRuns: 2000 })
  })

  it('gives each seabed a notation that is read as that seabed', () => {
    for (const seabed of seabeds) {
      const { notation } = seabedFacts(seabed)
      const answer = readChartNotation(notation)
      expect(answer).toMatchObject({ seabed, unread: [] })
      expect(writeChartNotation(answer.layers)).toBe(notation)
    }
  })

  it('refuses a word that the notation does not have', () => {
    expect(() => writeChartNotation([[{ noun: 'lava', qualifiers: [] }]])).toThrow(RangeError)
  })

  it('accounts for every character of any text, without throwing', () => {
    const piece = fc.constantFrom(...nouns.map(({ abbreviation }) => abbreviation), ...qualifiers.map(({ abbreviation }) => abbreviation), '.', '/', ' ', 'x', '?')
    const text = fc.oneof(fc.string({ unit: 'binary' }), fc.array(piece).map(pieces => pieces.join('')))
    fc.assert(fc.property(text, (any) => {
      const { layers: read, unread, seabed } = readChartNotation(any)
      for (const { text: piece, at } of unread) expect(any.slice(at, at + piece.length)).toBe(piece)
      expect(seabed === null).toBe(read.length === 0)
      const length = writeChartNotation(read).replace(/[./]/g, '').length + unread.map(({ text: piece }) => piece.replace(/[./]/g, '')).join('').length
      expect(length).toBe(any.replace(/[\s./]/g, '').length)
    }), { numRuns: 5000 })
  })
})
