import { describe, expect, it } from 'vitest'
import { surgeEnergyJ } from '#shared/load/energy'
import { windPresets } from '#shared/load/presets'
import { ruleTable } from '#shared/load/ruleTable'
import { tableLoad } from '#shared/load/table'
import { FT_M, KN_MS } from '#shared/units/constants'

const feet = (type: 'sailMonohull' | 'sailMultihull' | 'motor', lengthFt: number, beamFt: number) =>
  tableLoad({ type, lengthM: lengthFt * FT_M, beamM: beamFt * FT_M }, 30 * KN_MS)

describe('tableLoad', () => {
  it('keeps a value 0.05 ft above a row in it, and no more', () => {
    expect(feet('sailMonohull', 30.05, 9).table?.rowFt).toBe(30)
    expect(feet('sailMonohull', 30.06, 9).table?.rowFt).toBe(35)
    expect(feet('sailMonohull', 30, 9.05).table?.rowFt).toBe(30)
    expect(feet('sailMonohull', 30, 9.06).table).toMatchObject({ rowFt: 35, decidedBy: 'beam' })
  })

  it('takes the first row below 10 ft and has no neighbour there', () => {
    expect(feet('sailMonohull', 8, 3).table).toMatchObject({ rowFt: 10, neighbourN: null, decidedBy: 'length' })
  })

  it('is silent outside the table and says why', () => {
    expect(feet('sailMonohull', 60.1, 14)).toEqual({ table: null, note: expect.stringContaining('60 ft') })
    expect(feet('sailMonohull', 50, 15.1)).toEqual({ table: null, note: expect.stringContaining('15 ft') })
    expect(feet('motor', 50, 18.05).table?.rowFt).toBe(60)
    expect(feet('motor', 50, 18.2).note).toContain('18 ft')
  })

  it('enters a multihull by length alone, with a note', () => {
    const answer = feet('sailMultihull', 40, 22)
    expect(answer.table).toMatchObject({ rowFt: 40, decidedBy: 'length' })
    expect(answer.note).toContain('length alone')
  })

  it('grows with the square of the speed as entered', () => {
    const boat = { type: 'sailMonohull' as const, lengthM: 11, beamM: 3.5 }
    const at = (speedMs: number) => tableLoad(boat, speedMs).table!.loadN
    expect(at(20) / at(10)).toBeCloseTo(4, 12)
    expect(at(0)).toBe(0)
    expect(() => tableLoad(boat, -1)).toThrow(RangeError)
    expect(() => tableLoad({ ...boat, lengthM: Number.NaN }, 10)).toThrow('boat.lengthM')
  })
})

describe('ruleTable', () => {
  // The three reference boats of the method page.
  it.each([[8, 10], [11, 15], [15, 27]])('asks for the stated anchor on a boat of %d m', (lengthM, anchorKg) => {
    expect(ruleTable(lengthM).anchorKg).toBe(anchorKg)
  })

  it('takes the next longer row between rows', () => {
    expect(ruleTable(10.01, 10.01)).toMatchObject({ rowM: 11, anchorKg: 15 })
    expect(ruleTable(10.5, 9.5)).toMatchObject({ rowM: 10, anchorKg: 13, meanLengthM: 10 })
  })

  it('shows the first row below 6 m, and nothing above 24 m, with a note each', () => {
    expect(ruleTable(5)).toMatchObject({ rowM: 6, anchorKg: 8, chainMm: 6, note: expect.stringContaining('6 m') })
    expect(ruleTable(24.1, 24.1)).toMatchObject({ rowM: null, anchorKg: null, chainMm: null, note: expect.stringContaining('Outside the table') })
    expect(() => ruleTable(Number.NaN)).toThrow('boat.lengthM')
  })
})

describe('surgeEnergyJ', () => {
  // 1/2 m 1.075 v^2 with m 1.075 = 7525 kg and v 0.5 m/s.
  it('is the kinetic energy with its added water', () => {
    expect(surgeEnergyJ(7000, 'moderate')).toBeCloseTo(0.5 * 7525 * 0.25, 9)
    expect(surgeEnergyJ(7000, 'none')).toBe(0)
    expect(surgeEnergyJ(7000, 'open') / surgeEnergyJ(7000, 'sheltered')).toBeCloseTo(16, 12)
  })

  it('refuses what it does not know', () => {
    expect(() => surgeEnergyJ(-1, 'none')).toThrow('displacementKg')
    expect(() => surgeEnergyJ(1, 'huge' as never)).toThrow('swell')
    expect(() => surgeEnergyJ(1, 'toString' as never)).toThrow('swell')
  })
})

describe('windPresets', () => {
  it('are lunch stop 15 kn, working 30 kn and storm 42 kn', () => {
    expect(windPresets.map(({ name, speedMs }) => [name, speedMs / KN_MS])).toEqual([['lunch stop', 15], ['working', 30], ['storm', 42]])
  })
})
