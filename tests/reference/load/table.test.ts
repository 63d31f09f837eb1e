import { describe, expect, it } from 'vitest'
import { tableLoad } from '#shared/load/table'
import { tableRows } from '#shared/load/tableRows'
import { ruleTable } from '#shared/load/ruleTable'
import { FT_M, KN_MS, LBF_N } from '#shared/units/constants'
import published from './published.json'

const knots = (value: number) => value * KN_MS

// In the manner of ABYC H-40 table 1, from memory; 20-40 ft rows read second-hand (United States Power Squadrons, The Compass, June 2013).
describe('table load against the design loads in the manner of ABYC H-40', () => {
  it('holds every printed row', () => {
    expect(tableRows.map(row => Object.values(row))).toEqual(published.abycStyleLoads.rows)
  })

  it.each(published.abycStyleLoads.rows)('answers the 30-kn column at length %d ft', (loaFt, beamSailFt, beamPowerFt, _mooring, _storm, working) => {
    for (const [type, beamFt] of [['sailMonohull', beamSailFt], ['motor', beamPowerFt]] as const) {
      const { table } = tableLoad({ type, lengthM: loaFt! * FT_M, beamM: beamFt! * FT_M }, knots(30))
      expect(table?.rowFt).toBe(loaFt)
      expect(table!.loadN / LBF_N).toBeCloseTo(working!, 6)
    }
  })

  it.each(published.abycStyleLoads.rows)('comes within 4.2 %% of the other columns at length %d ft', (loaFt, beamSailFt, _power, _mooring, storm, _working, lunch) => {
    const at = (kn: number) => tableLoad({ type: 'sailMonohull', lengthM: loaFt! * FT_M, beamM: beamSailFt! * FT_M }, knots(kn)).table!.loadN / LBF_N
    expect(Math.abs(at(42) / storm! - 1)).toBeLessThan(0.042)
    expect(Math.abs(at(15) / lunch! - 1)).toBeLessThan(0.042)
  })

  it('agrees with the worked example of Gerr, Boat Mechanical Systems Handbook, ch. 24', () => {
    const { table } = tableLoad({ type: 'motor', lengthM: 32 * FT_M, beamM: 12 * FT_M }, knots(30))
    expect(table!.loadN / LBF_N).toBeCloseTo(published.abycStyleLoads.worked[0]!.expected, 6)
    expect(table?.rowFt).toBe(35)
  })
})

// UK MCA small-vessel code, table 20.1.
describe('rule table against the UK small-vessel code', () => {
  it.each(published.ukSmallVesselCode.rows)('gives the main anchor and chain at a mean length of %d m', (meanLengthM, mainKg, _kedgeKg, mainChainMm) => {
    const entry = ruleTable(meanLengthM!, meanLengthM!)
    expect(entry).toMatchObject({ rowM: meanLengthM, anchorKg: mainKg, chainMm: mainChainMm })
    expect(entry.note).toBeUndefined()
  })
})
