import { describe, expect, it } from 'vitest'
import { countEffects, fitRequest } from '#shared/schemas/fit'
import { loadRequest } from '#shared/schemas/load'
import { rankingRequest } from '#shared/schemas/ranking'
import { rodeRequest } from '#shared/schemas/rode'
import { fitPullExample, loadRequestExample, rankingRequestExample, rodeRequestExample } from '../../factories/requests'
import { gone, spoil } from '../../factories/faults'

const pathsOf = (result: { success: boolean, error?: { issues: { path: PropertyKey[] }[] } }) =>
  [...new Set(result.success ? [] : result.error?.issues.map(({ path }) => path.join('.')) ?? [])]
const load = (path: (string | number)[], value: unknown) => pathsOf(loadRequest.safeParse(spoil(loadRequestExample(), path, value)))
const rode = (path: (string | number)[], value: unknown) => pathsOf(rodeRequest.safeParse(spoil(rodeRequestExample(), path, value)))
const ranking = (path: (string | number)[], value: unknown) => pathsOf(rankingRequest.safeParse(spoil(rankingRequestExample(), path, value)))
const pull = (change: object) => pathsOf(fitRequest.safeParse({ pulls: [{ ...fitPullExample(), ...change }] }))

describe('a load', () => {
  it.each([[0, []], [0.05, []], [5, []], [0.04, ['currentMs']], [5.01, ['currentMs']]])('takes a current of %d m/s: %j', (speed, fields) => {
    expect(load(['currentMs'], speed)).toEqual(fields)
  })

  it('needs rode and height with swell, and neither without', () => {
    const { rode: _rode, heightM: _height, ...bare } = loadRequestExample()
    expect(pathsOf(loadRequest.safeParse(bare)).sort()).toEqual(['heightM', 'rode'])
    expect(pathsOf(loadRequest.safeParse({ ...bare, swell: 'none' }))).toEqual([])
  })
})

describe('a rode', () => {
  it('is weighed by a size or a weight', () => {
    expect(rode(['chain', 'diameterMm'], gone)).toEqual(['chain.diameterMm'])
    expect(rode(['rope', 'diameterMm'], gone)).toEqual(['rope.diameterMm'])
    expect(rode(['chain'], { lengthM: 40, submergedWeightNPerM: 19 })).toEqual([])
  })

  it('has one size', () => {
    expect(rode(['chain', 'sizeIn'], '3/8')).toEqual(['chain.sizeIn'])
    expect(rode(['snubber', 'sizeIn'], '1/2')).toEqual(['snubber.sizeIn'])
  })

  it.each(['5/16', '1 1/8', '1-1/8', '2', '0.5', '3/8"', '3/8 in'])('takes the inch size %s', (sizeIn) => {
    expect(rode(['chain'], { lengthM: 40, sizeIn })).toEqual([])
  })

  it.each(['', 'big', '3//8', '1e3', '3/8x', '١/٢'])('refuses the inch size %j', (sizeIn) => {
    expect(rode(['chain'], { lengthM: 40, sizeIn })).toContain('chain.sizeIn')
  })

  it('may be all rope, never nothing', () => {
    expect(rode(['chain', 'lengthM'], 0)).toEqual([])
    const { rope: _rope, ...noRope } = rodeRequestExample()
    expect(pathsOf(rodeRequest.safeParse({ ...noRope, chain: { lengthM: 0 } }))).toEqual(['chain.lengthM'])
  })
})

describe('a ranking', () => {
  const mud = { seabed: 'firm-mud', share: 0.5 }

  it.each([[[0.33, 0.33, 0.33], []], [[0.6, 0.41], []], [[0.6, 0.42], ['seabeds']], [[0.5], ['seabeds']], [[0.5, 0.489], ['seabeds']]])('takes shares %j: %j', (shares, fields) => {
    const names = ['firm-mud', 'loose-sand', 'rock']
    expect(ranking(['seabeds'], shares.map((share, index) => ({ seabed: names[index], share })))).toEqual(fields)
  })

  it('names no seabed twice', () => {
    expect(ranking(['seabeds'], [mud, mud])).toEqual(['seabeds.1.seabed'])
  })

  it.each([[0.8, []], [0.9, []], [0.95, []], [0.99, ['target']], [0.85, ['target']], ['0.9', ['target']]])('takes the target %j: %j', (target, fields) => {
    expect(ranking(['target'], target)).toEqual(fields)
  })

  it('says why 0.99 is refused', () => {
    const result = rankingRequest.safeParse({ ...rankingRequestExample(), target: 0.99 })
    expect(result.error?.issues[0]?.message).toBe('must be one of 0.8, 0.9, 0.95: the pulls cannot tell chances beyond 0.95 apart')
  })

  it.each(['Firm Mud', '../x', '-x', 'x--y', 'x'.repeat(81), ''])('refuses the design %j', (design) => {
    expect(ranking(['own'], { design, massKg: 15 })).toContain('own.design')
  })
})

describe('a pull', () => {
  it.each([
    ['moved at the first step', { heldN: 0, movedN: 500 }, []],
    ['the limit', { heldN: 4500, movedN: null }, []],
    ['never set', { heldN: 0, movedN: null, set: false }, []],
    ['says nothing', { heldN: 0, movedN: null, set: true }, ['pulls.0.heldN']],
    ['says nothing, set left out', { heldN: 0, movedN: null, set: undefined }, ['pulls.0.heldN']],
    ['moved below held', { heldN: 2000, movedN: 1900 }, ['pulls.0.movedN']],
    ['moved at held', { heldN: 2000, movedN: 2000 }, ['pulls.0.movedN']],
    ['moved at nothing', { heldN: 0, movedN: 0 }, ['pulls.0.movedN']],
    ['a seabed without a number', { seabed: 'rock' }, ['pulls.0.seabed']],
    ['a name over two lines', { trial: 'a\nb' }, ['pulls.0.trial']],
  ])('%s', (_name, change, fields) => {
    expect(pull(change)).toEqual(fields)
  })

  it('keeps a design to one family and a rig to one calibration', () => {
    const pulls = [fitPullExample(), { ...fitPullExample(), family: 'other' }, { ...fitPullExample(), calibrationSd: undefined }]
    expect(pathsOf(fitRequest.safeParse({ pulls }))).toEqual(['pulls.1.family', 'pulls.2.calibrationSd'])
  })
})

describe('the size of a fit', () => {
  it('counts every effect but the anchor-days', () => {
    // mean, exponent, family, design twice, trial, rig
    expect(countEffects([fitPullExample()])).toBe(7)
    expect(countEffects([fitPullExample(), { ...fitPullExample(), heldN: 1, trial: 'next' }])).toBe(8)
    expect(countEffects([{ ...fitPullExample(), modification: 'blunt' }])).toBe(9)
  })

  it('refuses more than 1000 of them', () => {
    const pulls = Array.from({ length: 995 }, (_, trial) => ({ ...fitPullExample(), trial: `day ${trial}` }))
    expect(countEffects(pulls)).toBe(1001)
    expect(pathsOf(fitRequest.safeParse({ pulls }))).toEqual(['pulls'])
    expect(pathsOf(fitRequest.safeParse({ pulls: pulls.slice(1) }))).toEqual([])
  })

  it('refuses more than 5000 pulls', () => {
    expect(pathsOf(fitRequest.safeParse({ pulls: Array.from({ length: 5001 }, fitPullExample) }))).toEqual(['pulls'])
  })
})
