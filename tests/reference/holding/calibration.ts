import { fitHolding } from '#shared/holding/fitHolding'
import { z90 } from '#shared/stats/normal'
import { sizeExponent } from '#shared/seabed/seabeds'
import { plainMeans } from '#shared/trial/plainMeans'
import type { PullRecord } from '#shared/types/holding'
import { simulateCampaign, truthKey } from '../../factories/campaign'
import { rms } from './fixture'

/** How estimates stood against the truth, over simulated campaigns. */
export interface Calibration {
  /** share of 90 % intervals that held the true median: all cells, and only those with pulls */
  coverage: number
  coveragePulled: number
  /** root mean square of ln(estimate/truth) over cells with pulls whose plain mean is not 0, and the same for the plain mean */
  estimateError: number
  plainError: number
}

/** ln of the plain mean over all masses, each scaled to 15 kg by the published exponent; null where it is 0 or nobody pulled. */
function plainLn15Kg(pulls: readonly PullRecord[]): number | null {
  if (pulls.length === 0) return null
  const exponent = sizeExponent(pulls[0]!.seabed)
  const rows = plainMeans(pulls)
  const sum = rows.reduce((total, row) => total + row.pulls * row.meanN * (15 / row.massKg) ** exponent, 0)
  return sum === 0 ? null : Math.log(sum / rows.reduce((total, row) => total + row.pulls, 0))
}

/** Simulates campaigns of about 720 pulls, fits each, and counts. */
export function calibrate(campaigns: number): Calibration {
  const inside: boolean[] = []
  const insidePulled: boolean[] = []
  const estimates: number[] = []
  const plain: number[] = []
  for (let seed = 101; seed < 101 + campaigns; seed++) {
    const { pulls, truth } = simulateCampaign({
      seed, designs: 16, families: 8, trialsPerSeabed: 5, designsPerTrial: 6, pullsPerDay: 3, rigs: 3, neverSetShare: 0.08, modifiedShare: 0.1,
      seabeds: ['soft-mud', 'firm-mud', 'stiff-clay', 'sandy-mud', 'loose-sand', 'hard-sand', 'gravel', 'weed-over-sand'],
    })
    for (const { seabed, designs } of fitHolding(pulls).seabeds) {
      for (const { design, lnMean15Kg, lnSd } of designs) {
        const error = lnMean15Kg - truth.get(truthKey(design, seabed))!
        const own = pulls.filter(pull => pull.design === design && pull.seabed === seabed && pull.modification === undefined)
        const plainLn = plainLn15Kg(own)
        inside.push(Math.abs(error) < z90 * lnSd)
        if (own.length > 0) insidePulled.push(Math.abs(error) < z90 * lnSd)
        if (plainLn === null) continue
        estimates.push(error)
        plain.push(plainLn - truth.get(truthKey(design, seabed))!)
      }
    }
  }
  const share = (list: readonly boolean[]): number => list.filter(Boolean).length / list.length
  return { coverage: share(inside), coveragePulled: share(insidePulled), estimateError: rms(estimates), plainError: rms(plain) }
}
