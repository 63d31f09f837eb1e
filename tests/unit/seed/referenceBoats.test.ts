import { describe, expect, it } from 'vitest'
import { makeWorld } from '../../../seed/world'
import { trueLnMedian } from '../../../seed/world/truth'
import { completeBoat } from '../../../shared/load/boat'
import { ruleTable } from '../../../shared/load/ruleTable'
import { windLoads } from '../../../shared/load/survey'

const world = makeWorld()
const seabeds = ['firm-mud', 'sandy-mud', 'loose-sand'] as const
/** 30 kn, as a gust; sd of ln holding against ln load: pulls, anchor-days, load; the normal quantile of 0.9 */
const speedMs = 30 * 1852 / 3600
const sd = Math.sqrt(0.35 ** 2 + 0.2 ** 2 + 0.25 ** 2)
const quantile90 = 1.2815515655446004

const boats = [
  { lengthM: 8, beamM: 2.7, ruleKg: 10 },
  { lengthM: 11, beamM: 3.5, ruleKg: 15 },
  { lengthM: 15, beamM: 4.5, ruleKg: 27 },
]

/** Smallest real size, kg, whose chance of holding in truth is at least 0.9 on a flat pull; null: none of its sizes. */
function smallestServing(design: string, seabed: (typeof seabeds)[number], loadN: number): number | null {
  const sizes = world.sizes.filter(s => s.design === design).map(s => s.massKg)
  return sizes.find(massKg => trueLnMedian(design, seabed, massKg) >= Math.log(loadN) + quantile90 * sd) ?? null
}

describe.each(boats)('a sail monohull of $lengthM x $beamM m at 30 kn of gusts', ({ lengthM, beamM, ruleKg }) => {
  const loadN = windLoads(completeBoat({ type: 'sailMonohull', lengthM, beamM }), { speedMs, kind: 'gust' }).sheerN

  it(`has ${ruleKg} kg in the rule table (UK small-vessel code, table 20.1)`, () => {
    expect(ruleTable(lengthM).anchorKg).toBe(ruleKg)
  })

  it.each(seabeds)('is served on %s by the better third of designs within a factor of two of the rule table', (seabed) => {
    const order = world.designs.map(d => d.slug).sort((a, b) => trueLnMedian(b, seabed, 20) - trueLnMedian(a, seabed, 20))
    for (const design of order.slice(0, 6)) {
      const massKg = smallestServing(design, seabed, loadN) ?? NaN
      expect(massKg / ruleKg, design).toBeGreaterThanOrEqual(0.5)
      expect(massKg / ruleKg, design).toBeLessThanOrEqual(2)
    }
  })

  it('is not served by some designs on loose sand', () => {
    expect(world.designs.filter(d => smallestServing(d.slug, 'loose-sand', loadN) === null).length).toBeGreaterThan(0)
  })
})
