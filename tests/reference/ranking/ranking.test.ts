import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { rankDesigns } from '#shared/ranking/rank'
import type { Exposure, WindKind } from '#shared/types/words'
import { makeCovariance, makeDesign, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

/** What generate.py writes: see README.md for where it comes from. */
interface Case {
  plan: { dragAreaM2: number, exposure: Exposure, kind: WindKind, speedMs: number, heightM: number, lengthM: number, weightNPerM: number }
  massKg: number
  fit: Record<'lnMean15Kg' | 'lnSd' | 'betaMean' | 'betaSd' | 'betaCovariance' | 'exponent' | 'sigma' | 'trial' | 'anchorDay' | 'mostShown15KgN', number>
  surveyN: number
  upliftFactor: number
  chance: number
  low90N: number
  medianN: number
  gustMs: number | null
  meanMs: number | null
  atLeast: boolean
  tableWindMs: number | null
}

const path = fileURLToPath(new URL('./cases.json', import.meta.url))
const cases = JSON.parse(readFileSync(path, 'utf8')) as Case[]

function answer({ plan, massKg, fit }: Case) {
  const estimate = makeEstimate('alder', Math.exp(fit.lnMean15Kg), { lnSd: fit.lnSd, mostShown15KgN: fit.mostShown15KgN })
  const covariance = makeCovariance([fit.lnSd], 0, fit.betaSd, fit.betaCovariance)
  const seabed = makeSeabedFit('loose-sand', [estimate], { covariance, exponent: fit.exponent, betaMean: fit.betaMean })
  const stored = makeFit([seabed], { sigma: fit.sigma })
  const bowHeightM = 1
  const request = makePlan({
    boat: { type: 'sailMonohull', lengthM: 10, beamM: 3, bowHeightM, windage: [{ part: 'all', areaM2: plan.dragAreaM2, dragCoefficient: 1 }] },
    wind: { speedMs: plan.speedMs, kind: plan.kind, exposure: plan.exposure, sheerDeg: 0 },
    rode: { chain: { lengthM: plan.lengthM, submergedWeightNPerM: plan.weightNPerM } },
    depthM: plan.heightM - bowHeightM,
    massKg,
  })
  return rankDesigns(request, [makeDesign('alder')], { ...stored, sds: { ...stored.sds, trial: fit.trial, anchorDay: fit.anchorDay } })
}

describe('chance and holding wind against a second program', () => {
  it('covers caps, winds past 64 kn and lifted rodes', () => {
    expect(cases.length).toBe(60)
    expect(cases.filter(({ atLeast }) => atLeast).length).toBeGreaterThan(5)
    expect(cases.filter(({ gustMs }) => gustMs === null).length).toBeGreaterThan(1)
    expect(cases.filter(({ upliftFactor }) => upliftFactor < 0.9).length).toBeGreaterThan(10)
  })

  it.each(cases.map((one, i) => [i, one] as const))('case %i', (_, one) => {
    const { load, rows } = answer(one)
    const seabed = rows[0]?.seabeds[0]
    expect(load.survey.totalN).toBeCloseTo(one.surveyN, 6)
    expect(seabed?.upliftFactor).toBeCloseTo(one.upliftFactor, 9)
    expect(seabed?.holdingN?.median).toBeCloseTo(one.medianN, 6)
    expect(seabed?.holdingN?.low90).toBeCloseTo(one.low90N, 5)
    expect(seabed?.chance).toBeCloseTo(one.chance, 9)
    const wind = seabed?.holdingWind
    if (one.gustMs === null) expect(wind).toEqual({ reason: 'beyond64kn' })
    else {
      // read from a table: within a fiftieth of a knot
      const { meanMs, gustMs, atLeast } = wind !== null && wind !== undefined && 'gustMs' in wind ? wind : { meanMs: 0, gustMs: 0, atLeast: false }
      expect(Math.abs(gustMs - one.gustMs)).toBeLessThan(0.01)
      expect(meanMs / (one.meanMs ?? Number.NaN)).toBeCloseTo(gustMs / one.gustMs, 9)
      expect(atLeast).toBe(one.atLeast)
    }
    if (one.tableWindMs === null) expect(seabed?.tableWindMs).toBeNull()
    else expect(Math.abs((seabed?.tableWindMs ?? Number.NaN) - one.tableWindMs)).toBeLessThan(0.01)
  })
})
