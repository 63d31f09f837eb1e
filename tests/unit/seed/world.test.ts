import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { makeWorld, pullRecords } from '../../../seed/world'
import { solveRode } from '../../../shared/rode/catenary'
import { families, numberedSeabeds, seabeds } from '../../../shared/types/words'

const world = makeWorld()
const sha256 = (text: string) => createHash('sha256').update(text).digest('hex')
const distinct = <T>(items: readonly T[]) => [...new Set(items)]

describe('the demo world', () => {
  it('is the same bytes every time, and another world for another seed', () => {
    const bytes = JSON.stringify(world)
    expect(JSON.stringify(makeWorld())).toBe(bytes)
    expect(JSON.stringify(makeWorld('another'))).not.toBe(bytes)
    expect(sha256(bytes)).toBe('c4a491c2e81d1ee6f7819692aa12cfa3ee1de7a47b9b10efddaa7a6d166f25b4')
  })

  it('has at least 16 invented designs over 9 families, 4 to 7 sizes each, none under 5 kg', () => {
    expect(world.designs.length).toBeGreaterThanOrEqual(16)
    expect(world.designs.every(d => d.invented)).toBe(true)
    expect(distinct(world.designs.map(d => d.family))).toHaveLength(9)
    for (const { slug } of world.designs) {
      const masses = world.sizes.filter(s => s.design === slug).map(s => s.massKg)
      expect(masses.length, slug).toBeGreaterThanOrEqual(4)
      expect(masses.length, slug).toBeLessThanOrEqual(7)
      expect(masses).toEqual(distinct(masses).sort((a, b) => a - b))
      expect(masses[0]).toBeGreaterThanOrEqual(5)
    }
    expect(world.sizes.some(s => s.shankStrengthN === null)).toBe(true)
    expect(world.sizes.some(s => s.stowsFlat)).toBe(true)
    expect(world.sizes.every(s => Number.isInteger(s.priceMinor) && s.priceMinor > 0)).toBe(true)
  })

  it('knows every seabed and family of the product, and leaves four numbered seabeds without pulls', () => {
    expect(world.seabeds.map(s => s.slug)).toEqual([...seabeds])
    expect(world.families.map(f => f.slug)).toEqual([...families])
    const pulled = distinct(world.pulls.map(p => p.seabed))
    expect(world.seabeds.filter(s => s.pulled).map(s => s.slug).sort()).toEqual(pulled.sort())
    expect(numberedSeabeds.filter(s => !pulled.includes(s))).toEqual(['silt', 'thin-sand', 'shell', 'weed-over-mud'])
  })

  it('has 40 trials over three seasons with 800 pulls or more by one rig with a 4.5 kN limit', () => {
    expect(world.trials).toHaveLength(40)
    expect(distinct(world.trials.map(t => t.slug))).toHaveLength(40)
    expect(distinct(world.trials.map(t => t.season))).toEqual([2024, 2025, 2026])
    expect(world.pulls.length).toBeGreaterThanOrEqual(800)
    expect(world.rigs.map(r => r.limitN)).toEqual([4500])
    expect(world.rigs[0]?.thrustStepsN.at(-1)).toBe(4500)
    for (const t of world.trials) expect([t.latitudeDeg * 100, t.longitudeDeg * 100].every(x => Math.abs(x - Math.round(x)) < 1e-6)).toBe(true)
  })

  it('numbers the pulls of a day from 1 and pulls real sizes of known designs', () => {
    for (const trial of world.trials) {
      const orders = world.pulls.filter(p => p.trial === trial.slug).map(p => p.order)
      expect(orders).toEqual(orders.map((_, i) => i + 1))
      expect(orders.length).toBeLessThanOrEqual(45)
    }
    const known = new Set(world.sizes.map(s => `${s.design}/${s.massKg}`))
    expect(world.pulls.every(p => known.has(`${p.design}/${p.massKg}`))).toBe(true)
  })

  it('states the shank angle that its rode gives at the rig\'s limit', () => {
    const weightNPerM = 2.20 * 0.869 * 9.80665 // 10 mm chain, DIN 766 (memory)
    for (const t of world.trials) {
      const shape = solveRode({ heightM: t.depthM + t.bowHeightM, horizontalLoadN: 4500, chain: { lengthM: t.chainLengthM, weightNPerM } })
      expect(t.shankAngleDeg).toBeCloseTo(shape.shankAngleRad * 180 / Math.PI, 0)
      expect(Math.abs(t.shankAngleDeg - shape.shankAngleRad * 180 / Math.PI)).toBeLessThanOrEqual(0.051)
    }
    expect(world.trials.filter(t => t.shankAngleDeg > 0).length).toBeGreaterThan(0)
  })

  it('hands the fit one record a pull, each with a bracket where it set', () => {
    const records = pullRecords(world)
    expect(records).toHaveLength(world.pulls.length)
    for (const r of records) {
      if (!r.set) expect([r.heldN, r.movedN]).toEqual([0, null])
      else if (r.movedN === null) expect(r.heldN).toBeGreaterThan(0)
      else expect(r.movedN).toBeGreaterThan(r.heldN)
    }
    expect(records.filter(r => r.pair !== undefined)).toHaveLength(world.pulls.filter(p => p.pair !== null).length)
    expect(records.some(r => r.fresh === false)).toBe(true)
  })
})
