import { describe, expect, it } from 'vitest'
import { canonicalOrder, dataHash } from '#shared/trial/canonical'
import { checkPulls } from '#shared/trial/checkPulls'
import { heldInterval, middleLoadN, settingOf } from '#shared/trial/observation'
import { plainMeans } from '#shared/trial/plainMeans'
import { pull } from '../../factories/pull'

describe('what a pull says', () => {
  it('puts its holding between held and moved', () => {
    expect(heldInterval(pull())).toEqual({ heldN: 1000, movedN: 1200 })
    expect(heldInterval(pull({ movedN: null }))).toEqual({ heldN: 1000, movedN: Infinity })
    expect(heldInterval(pull({ heldN: 0, movedN: 300 }))).toEqual({ heldN: 0, movedN: 300 })
  })

  it('enters no fit where it never set, was fouled, or followed a breakout', () => {
    expect(heldInterval(pull({ set: false }))).toBeNull()
    expect(heldInterval(pull({ setting: 'fouled' }))).toBeNull()
    expect(heldInterval(pull({ fresh: false }))).toBeNull()
    expect(heldInterval(pull({ setting: 'setAfterDragging' }))).not.toBeNull()
  })

  it('reads the setting from set alone where nothing else is recorded', () => {
    expect(settingOf(pull())).toBe('set')
    expect(settingOf(pull({ set: false }))).toBe('neverSet')
  })

  it('has a middle load that scales with it', () => {
    expect(middleLoadN({ heldN: 400, movedN: 900 })).toBe(600)
    expect(middleLoadN({ heldN: 0, movedN: 300 })).toBe(150)
    expect(middleLoadN({ heldN: 4500, movedN: Infinity })).toBe(4500)
  })
})

describe('plain means', () => {
  it('count failures as 0 and say at least where a pull reached the limit (common practice)', () => {
    const rows = plainMeans([
      pull({ heldN: 900 }), pull({ set: false, heldN: 0 }), pull({ heldN: 4500, movedN: null }), pull({ setting: 'fouled', heldN: 9000, movedN: 9900 }),
      pull({ massKg: 10, heldN: 300 }), pull({ massKg: 10, heldN: 500, fresh: false }),
    ])
    expect(rows).toEqual([
      { massKg: 10, meanN: 400, atLeast: false, pulls: 2 },
      { massKg: 15, meanN: 1800, atLeast: true, pulls: 3 },
    ])
  })
})

describe('canonical order', () => {
  const pulls = [pull(), pull({ trial: 't0' }), pull({ heldN: 800 }), pull({ modification: 'blunted-edge' })]

  it('does not depend on the order given', () => {
    expect(canonicalOrder([...pulls].reverse())).toEqual(canonicalOrder(pulls))
    expect(dataHash([...pulls].reverse())).toBe(dataHash(pulls))
  })

  it('names other data otherwise', () => {
    expect(dataHash([pull({ heldN: 1000.5 })])).not.toBe(dataHash([pull()]))
    expect(dataHash(pulls)).toMatch(/^[0-9a-f]{64}$/)
  })
})

describe('pulls that cannot be read', () => {
  it.each([
    [pull({ massKg: 0 }), /pulls\[0\]\.massKg must be between 0.1 and 100000, got 0/],
    [pull({ heldN: NaN }), /pulls\[0\]\.heldN must be between 0 and 10000000, got NaN/],
    [pull({ movedN: 900 }), /pulls\[0\]\.movedN must be above heldN 1000, got 900/],
    [pull({ heldN: 0, movedN: null }), /pulls\[0\]\.heldN must be above 0 where the anchor set and did not move/],
    [pull({ shankAngleDeg: 91 }), /pulls\[0\]\.shankAngleDeg must be between 0 and 90, got 91/],
    [pull({ rig: 'r', calibrationSd: -1 }), /pulls\[0\]\.calibrationSd must be between 0 and 1, got -1/],
    [pull({ setting: 'neverSet' }), /pulls\[0\]\.set must be false where setting is neverSet, got true/],
  ])('%# are named', (bad, message) => {
    expect(() => checkPulls([bad])).toThrow(RangeError)
    expect(() => checkPulls([bad])).toThrow(message)
  })

  it('name a design of two families and a rig of two errors', () => {
    expect(() => checkPulls([pull(), pull({ family: 'grapnel' })])).toThrow(/pulls\[1\]\.family must be claw as before for d1, got grapnel/)
    expect(() => checkPulls([pull({ rig: 'r', calibrationSd: 0.1 }), pull({ rig: 'r' })])).toThrow(/calibrationSd must be 0.1 as before for r, got null/)
  })
})
