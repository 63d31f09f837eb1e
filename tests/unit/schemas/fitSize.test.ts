import { describe, expect, it } from 'vitest'
import { countEffects as counted } from '../../../shared/schemas/fit'
import { countEffects, recordOf } from '../../../shared/holding/readRequest'
import type { FitPull } from '../../../shared/types/fit'
import { makeWorld, pullRecords } from '../../../seed/world'

describe('the effects that a request is refused by', () => {
  it('are those that the fit would have', () => {
    const pulls: FitPull[] = pullRecords(makeWorld()).filter(pull => pull.fresh !== false && pull.setting !== 'fouled')
      .map(({ trial, design, family, massKg, seabed, modification, rig, calibrationSd, set, heldN, movedN, shankAngleDeg }) =>
        ({ trial, design, family, massKg, seabed, modification, rig, calibrationSd, set, heldN, movedN, shankAngleDeg }))
    expect(countEffects(pulls.map(recordOf))).toBeGreaterThan(200)
    expect(counted(pulls)).toBe(countEffects(pulls.map(recordOf)))
  })
})
