import { describe, expect, it } from 'vitest'
import { answerFigures, wordForField } from '~/utils/plan/answer'
import { cautionsAt, placeOf } from '~/utils/plan/cautionPlaces'
import { readPlan } from '~/utils/plan/read'
import { readQuery } from '~/utils/plan/typed'
import type { Query } from '~/utils/plan/typed'
import { isOwnPath } from '~/utils/ownPath'
import { readPreferences, writePreferences } from '~/utils/preferences'
import { rankingRequest } from '#shared/schemas/ranking'
import { standingCautions } from '#shared/ranking/cautions'

const read = (query: Query, system: 'metric' | 'imperial' | 'asAtSea' = 'asAtSea') => readPlan(readQuery(query), system)
const keys = (query: Query) => read(query).issues.map(({ key }) => key)

describe('reading a plan', () => {
  it('turns the sentence into SI', () => {
    const { request, issues } = read({ length: '35\' 2"', displacement: '4.5 t', chain: '45', size: '5/16"', wind: '30', depth: '20 ft', anchor: '33 lb' })
    expect(issues).toEqual([])
    expect(request?.boat.lengthM).toBeCloseTo(10.7188, 4)
    expect(request?.boat.displacementKg).toBe(4500)
    expect(request?.rode.chain).toEqual({ lengthM: 45, sizeIn: '5/16', grade: 'G30' })
    expect(request?.wind.speedMs).toBeCloseTo(15.4333, 4)
    expect(request?.depthM).toBeCloseTo(6.096, 6)
    expect(request?.massKg).toBeCloseTo(14.9685, 4)
  })

  it('reads a Beaufort force as a mean at 10 m, whatever the sentence says', () => {
    expect(read({ wind: 'F8', blow: 'gust' }).request?.wind).toMatchObject({ kind: 'mean', at10m: true })
  })

  it.each<[string, Query]>([
    ['the start', {}],
    ['rope, shackle and current', { rope: '30 m', ropesize: '14 mm', current: '2 kn', shackle: '10 mm', roller: 'yes', swell: 'moderate' }],
    ['windage of one\'s own', { hull: '5 m2', gearcd: '1,5', wll: '10 m' }],
    ['an own anchor', { own: 'some-design', ownmass: '15 kg', order: 'weighted', target: '0.95', sheer: '20°' }],
    ['no snubber', { snubber: 'none' }],
  ])('asks the API for nothing that it refuses: %s', (_, query) => {
    const { request } = read(query)
    expect(rankingRequest.safeParse(request).error?.issues ?? []).toEqual([])
  })

  it('names the word that is wrong, and keeps the others', () => {
    expect(keys({ length: '', wind: 'strong', rise: '-2 m' }).sort()).toEqual(['length', 'rise', 'wind'])
    expect(keys({ rope: '20 m' })).toEqual(['ropesize'])
    expect(keys({ own: 'some-design' })).toEqual(['ownmass'])
    expect(keys({ chain: '0 m' })).toEqual(['chain'])
    expect(keys({ gearcd: 'x', hull: 'y' })).toEqual(['hull', 'gearcd'])
  })

  it('leads a refusal of the calculation to its word', () => {
    const { request, strongpoints } = read({ chain: '8 m' })
    const outcome = request && answerFigures(request, strongpoints)
    expect(outcome).toMatchObject({ key: 'chain', message: expect.stringMatching(/^Too short to reach the bottom/) })
    expect(wordForField('rode.rope.sizeIn')).toBe('ropesize')
    expect(wordForField('seabeds.1.share')).toBe('bed1')
    expect(wordForField('boat.windage.3.areaM2')).toBe('stays')
    expect(wordForField('own.design')).toBe('own')
  })

  it('judges strength with the shackle and the roller that the ranking does not ask for', () => {
    const { request, strongpoints } = read({ shackle: '10 mm', roller: 'yes' })
    const outcome = request && answerFigures(request, strongpoints)
    const parts = outcome && 'plan' in outcome ? outcome.plan.rode?.strength.map(({ part }) => part) : []
    expect(parts).toEqual(['chain', 'snubber', 'shackle'])
  })
})

describe('cautions', () => {
  it('all stand somewhere, each once', () => {
    const placed = (['ranking', 'strength', 'table', 'rode'] as const).flatMap(place => cautionsAt(standingCautions, place))
    expect(placed.toSorted()).toEqual(standingCautions.toSorted())
    expect(placeOf('Holding is not strength: no pull here tested a shank sideways.')).toBe('strength')
  })
})

describe('what a person typed', () => {
  it.each([['/plan', true], ['/', true], ['//evil', false], ['/\\evil', false], ['https://evil', false], ['', false]])('%s is a path of our own: %s', (path, own) => {
    expect(isOwnPath(path)).toBe(own)
  })

  it('becomes one of the fixed preferences or nothing', () => {
    expect(readPreferences('night.imperial')).toEqual({ mode: 'night', units: 'imperial' })
    expect(readPreferences('"><b>.x')).toEqual({ mode: 'system', units: 'asAtSea' })
    expect(readPreferences(7)).toEqual({ mode: 'system', units: 'asAtSea' })
    expect(writePreferences({ mode: 'sun', units: 'metric' })).toBe('sun.metric')
  })
})
