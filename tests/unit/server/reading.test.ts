import { beforeEach, describe, expect, it, vi } from 'vitest'
import type { Readable } from '#shared/access/mayRead'
import { makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'

const denied = vi.hoisted(() => ({ what: new Set<string>(), asked: [] as string[] }))
vi.mock('#shared/access/mayRead', () => ({
  visitor: { kind: 'visitor' },
  mayRead: (_actor: unknown, readable: Readable) => {
    denied.asked.push(readable.what)
    return denied.what.has(readable.what) ? { allowed: false, reason: 'not for you' } : { allowed: true }
  },
}))

const fit = makeFit([makeSeabedFit('loose-sand', [makeEstimate('one', 2000), makeEstimate('two', 1500)])])
const design = { slug: 'one', name: 'One', family: 'plain-scoop', familyName: 'Plain scoop', description: '', settings: [], invented: true, sizes: [] }
const pull = { id: 1, ordinal: 1, design: 'one', name: 'One', massKg: 15, seabed: 'loose-sand', setting: 'set', set: true, fresh: true, heldN: 1000, movedN: 1200, shankAngleDeg: 0, modification: null, supersededBy: null }

vi.mock('../../../server/services/application', () => ({ database: () => ({}) }))
vi.mock('../../../server/services/evidence', () => ({ currentEvidence: async () => ({ fit, catalogue: [], rigs: 2 }) }))
vi.mock('../../../server/db/queries/designPages', () => ({
  pageSize: 50, pageOfDesigns: async () => ({ total: 1, designs: [{ ...design, pulls: 1, tested: [] }] }), designNames: async () => [design], findDesign: async () => ({ id: 1, design }),
}))
vi.mock('../../../server/db/queries/readPulls', () => ({
  pullsOfDesign: async () => [pull], pullsOnSeabed: async () => [pull], mannerOf: async () => ({ pulls: 1 }), trialsOfDesign: async () => [], modificationNames: async () => new Map(),
}))
vi.mock('../../../server/db/queries/trialPages', () => ({
  pageOfTrials: async () => ({ total: 1, trials: [{ slug: 't' }] }), findTrial: async () => ({ id: 1, trial: { slug: 't' } }), pullsOfTrial: async () => [pull], repliesTo: async () => [], insertQuestion: async () => null,
}))

const { designBySlug, designPage, namesOfDesigns } = await import('../../../server/services/designPages')
const { seabedBySlug } = await import('../../../server/services/seabedPages')
const { trialBySlug, trialPage, trialPulls } = await import('../../../server/services/trialPages')
const actor = { kind: 'visitor' } as const

beforeEach(() => {
  denied.what.clear()
  denied.asked.length = 0
})

describe('what may be read decides what is answered', () => {
  it('all of it, when all may be read', async () => {
    expect((await designBySlug(actor, 'one', 15)).seabeds[0]).toMatchObject({ holdingN: { median: expect.closeTo(2000, 6) }, ticks: [{ atLimit: false }] })
    expect((await seabedBySlug(actor, 'loose-sand')).rows.map(({ design: slug }) => slug)).toEqual(['one', 'two'])
    expect((await trialBySlug(actor, 't')).comparisons).toHaveLength(1)
    expect((await trialPulls(actor, 't')).pulls).toHaveLength(1)
    expect((await trialPage(actor, {})).trials).toHaveLength(1)
    expect(new Set(denied.asked)).toEqual(new Set(['design', 'estimate', 'pulls', 'seabed', 'trial']))
  })

  it('no figure where estimates may not', async () => {
    denied.what.add('estimate')
    expect((await designBySlug(actor, 'one', 15)).seabeds[0]).toMatchObject({ holdingN: null, setShare: null, pulls: 12 })
    expect((await seabedBySlug(actor, 'loose-sand')).rows).toEqual([])
    expect((await trialBySlug(actor, 't')).comparisons).toEqual([])
  })

  it('no single pull where pulls may not', async () => {
    denied.what.add('pulls')
    expect((await designBySlug(actor, 'one', 15)).seabeds[0]?.ticks).toEqual([])
    expect((await seabedBySlug(actor, 'loose-sand')).rows.map(({ ticks }) => ticks)).toEqual([[], []])
    expect((await trialPulls(actor, 't')).pulls).toEqual([])
    expect((await trialBySlug(actor, 't')).comparisons).toEqual([])
  })

  it('nothing at all of a design, a seabed or a trial that may not', async () => {
    for (const what of ['design', 'seabed', 'trial']) denied.what.add(what)
    expect((await designPage(actor, {})).designs).toEqual([])
    expect((await namesOfDesigns(actor)).designs).toEqual([])
    expect((await trialPage(actor, {})).trials).toEqual([])
    for (const ask of [designBySlug(actor, 'one'), seabedBySlug(actor, 'loose-sand'), trialBySlug(actor, 't'), trialPulls(actor, 't')]) {
      await expect(ask).rejects.toMatchObject({ statusCode: 404 })
    }
  })
})
