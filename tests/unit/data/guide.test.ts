import { describe, expect, it } from 'vitest'
import { guideOf, kindOf, shortJson, type ApiDocument } from '~/utils/data/guide'
import { changeInWords, movesInWords, newcomersInWords, sizeInWords } from '~/utils/data/words'
import type { ReleaseChanges } from '#shared/types/release'

const point = { type: 'object', description: 'A point', required: ['x'], properties: { x: { type: 'number', minimum: 0, maximum: 5000, description: 'East (m)' }, y: { type: 'number' }, z: { type: 'number' }, name: { type: 'string', minLength: 1, maxLength: 60 } } }
const json = (schema: object) => ({ 'application/json': { schema } })
const document: ApiDocument = {
  paths: {
    '/api/a/{slug}': { post: {
      operationId: 'a', summary: 'First', parameters: [
        { name: 'slug', in: 'path', required: true, description: 'Which', schema: { type: 'string' }, example: 'one' }, { name: 'q', in: 'query', required: false, schema: { type: 'integer', minimum: -9007199254740991, maximum: 9007199254740991 }, example: 'a b' },
      ],
      requestBody: { content: { 'application/json': { schema: { $ref: '#/components/schemas/A' }, example: { at: { x: 1 } } } } },
      responses: { 201: { description: 'The answer', content: json({ type: 'object', properties: { list: { type: 'array', description: 'All', items: point } } }) }, 422: { description: 'Refused' } },
    } },
    '/api/files': { get: { operationId: 'files', summary: 'Second', responses: { 200: { description: '', content: { 'text/csv': {}, 'application/json': {} } } } } },
  },
  components: { schemas: { A: { type: 'object', required: ['at'], properties: { at: { anyOf: [point, { type: 'null' }] } } } } },
}

describe('the API as a page prints it', () => {
  const { routes: [first, second] } = guideOf(document)

  it('lists every field with its place, what it may be and whether it is needed', () => {
    expect(first?.sent.map(({ name }) => name)).toEqual(['at', 'at.x', 'at.y', 'at.z', 'at.name'])
    expect(first?.sent[0]).toEqual({ name: 'at', kind: 'object or null', meaning: 'A point', needed: true })
    expect(first?.sent[1]).toEqual({ name: 'at.x', kind: 'number 0 to 5\u00A0000', meaning: 'East (m)', needed: true })
    expect(first?.sent[4]?.kind).toBe('text 1 to 60 characters')
  })

  it('tells an object once and points to it afterwards', () => {
    expect(first?.answered).toEqual([{ name: 'list', kind: 'list', meaning: 'All', needed: false, asIn: { id: 'a', path: '/api/a/{slug}', field: 'at' } }])
  })

  it('has an example that can be sent, and the refusals', () => {
    expect(first?.example).toBe('POST /api/a/one?q=a%20b\nContent-Type: application/json\n\n{ "at": { "x": 1 } }')
    expect(first).toMatchObject({ status: '201', refusals: [{ status: '422', meaning: 'Refused' }], address: [{ name: 'slug', needed: true }, { name: 'q', kind: 'whole number', needed: false }] })
    expect(second).toMatchObject({ files: ['text/csv', 'application/json'], example: 'GET /api/files', answered: [] })
  })

  it('writes short things on one line and long ones on several, and stays JSON', () => {
    const value = { a: [1, 2], b: 'x'.repeat(70), c: [], d: { e: null } }
    expect(JSON.parse(shortJson(value))).toEqual(value)
    expect(shortJson(value).split('\n').slice(0, 2)).toEqual(['{', '  "a": [ 1, 2 ],'])
    expect(kindOf({ enum: ['a', 'b'] })).toBe('a · b')
  })
})

describe('what changed, in words', () => {
  const changes: ReleaseChanges = { since: '2024', pulls: 1, corrections: 0, trials: ['t'], designs: [{ slug: 'x', name: 'X' }], modifications: [], seabeds: [], compared: 10, added: 2, movedMuch: 3, outside: 1, widthRatio: 0.8, largest: [] }

  it('says what came in and how far estimates moved', () => {
    expect(newcomersInWords(changes)).toBe('1 more pull in 1 more trial; new are 1 design (X); no pull was corrected.')
    expect(movesInWords(changes)).toBe('Of 10 estimates that both releases give, 3 moved by more than 15 %, and 1 lies outside the earlier 90 % interval. In the middle, an interval is 0.80 times as wide as it was. 2 estimates came in.')
    expect(newcomersInWords({ ...changes, since: null, pulls: 40, seabeds: ['loose-sand'] })).toBe('40 pulls in 1 trial of 1 design and 1 seabed; no pull was corrected.')
    expect(movesInWords({ ...changes, since: null, added: 5 })).toBe('5 estimates, the first there are.')
    expect(newcomersInWords({ ...changes, corrections: 2 })).toContain('2 pulls were corrected.')
  })

  it('prints sizes and changes', () => {
    expect([sizeInWords(999), sizeInWords(212_338), sizeInWords(1_234_567)]).toEqual(['999 B', '212 kB', '1.2 MB'])
    expect([changeInWords(1.123), changeInWords(0.71), changeInWords(1.004)]).toEqual(['+12 %', '−29 %', 'under 1 %'])
  })
})
