import { describe, expect, it } from 'vitest'
import type { WorldPull } from '../../../seed/world'
import { makeWorld } from '../../../seed/world'

const world = makeWorld()
const count = (test: (pull: WorldPull) => boolean) => world.pulls.filter(test).length
const entered = (pull: WorldPull) => pull.setting === 'set' || pull.setting === 'setAfterDragging'

describe('what happens in the demo world', () => {
  it('has every kind of end, aftermath, veer outcome, attitude and fouling', () => {
    expect(count(p => p.end === 'atTheLimit')).toBeGreaterThan(50)
    expect(count(p => p.setting === 'neverSet')).toBeGreaterThan(50)
    expect(count(p => p.setting === 'fouled')).toBeGreaterThan(5)
    for (const end of ['stoppedEarly', 'crept', 'dragged', 'brokeOut']) expect(count(p => p.end === end), end).toBeGreaterThan(20)
    for (const after of ['reset', 'didNotReset', 'notTried']) expect(count(p => p.after === after), after).toBeGreaterThan(5)
    for (const veer of ['stayedBuried', 'brokeOutAndReset', 'brokeOutAndDidNotReset']) expect(count(p => p.veerOutcome === veer), veer).toBeGreaterThan(5)
    for (const a of ['upright', 'onItsSide', 'inverted', 'buried', 'notSeen']) expect(count(p => p.attitude === a), a).toBeGreaterThan(10)
    for (const f of ['clean', 'mudBall', 'clayFilled', 'weed', 'shell', 'stoneJammed', 'ownChain']) expect(count(p => p.fouling === f), f).toBeGreaterThan(2)
    expect(count(p => p.condition === 'bent')).toBeGreaterThan(0)
  })

  it('keeps ends, aftermaths and brackets consistent', () => {
    for (const p of world.pulls) {
      expect(p.end === null).toBe(!entered(p))
      expect(p.after !== null).toBe(p.end === 'brokeOut')
      expect(p.creepRateMPerMin !== null).toBe(p.end === 'crept')
      expect(p.veerDeg === null).toBe(p.veerOutcome === null)
      expect(p.movedN === null).toBe(!entered(p) || p.end === 'atTheLimit' || p.end === 'stoppedEarly')
      if (p.end === 'atTheLimit') expect(p.heldN).toBe(4500)
      expect(p.firstTry).toBe(p.fresh && p.setting === 'set')
    }
  })

  it('brackets each holding by neighbouring thrust steps', () => {
    const steps = [0, ...world.rigs[0]?.thrustStepsN ?? []]
    for (const p of world.pulls) {
      expect(steps).toContain(p.heldN)
      if (p.movedN !== null) expect(steps.indexOf(p.movedN)).toBe(steps.indexOf(p.heldN) + 1)
    }
  })

  it('marks a pull in the same deployment as not fresh, right after a breakout that reset', () => {
    for (const p of world.pulls.filter(q => !q.fresh)) {
      const before = world.pulls.find(q => q.trial === p.trial && q.order === p.order - 1)
      expect(before).toMatchObject({ design: p.design, massKg: p.massKg, after: 'reset' })
    }
  })

  it('pulls five designs at 10, 20 and 35 kg', () => {
    const masses = new Map<string, Set<number>>()
    for (const p of world.pulls.filter(q => q.modification === null)) masses.set(p.design, (masses.get(p.design) ?? new Set()).add(p.massKg))
    const three = [...masses].filter(([, seen]) => [10, 20, 35].every(m => seen.has(m)))
    expect(three).toHaveLength(5)
  })

  it('tries four modifications back to back on four seabeds, alternated and within 50 m', () => {
    const pairs = new Map<string, WorldPull[]>()
    for (const p of world.pulls) if (p.pair !== null) pairs.set(p.pair, [...pairs.get(p.pair) ?? [], p])
    const cells = new Map<string, number>()
    for (const [one, two] of pairs.values()) {
      if (!one || !two) throw new Error('a pair must have two pulls')
      expect([one.modification === null, two.modification === null].filter(Boolean)).toHaveLength(1)
      expect(two).toMatchObject({ trial: one.trial, design: one.design, massKg: one.massKg, seabed: one.seabed, order: one.order + 1 })
      expect(Math.hypot(one.eastM - two.eastM, one.northM - two.northM)).toBeLessThan(50)
      const key = `${one.modification ?? two.modification}/${one.seabed}`
      cells.set(key, (cells.get(key) ?? 0) + 1)
    }
    expect(cells.size).toBe(16)
    expect(Math.min(...cells.values())).toBeGreaterThanOrEqual(5)
    const firstIsModified = [...pairs.values()].filter(([one]) => one?.modification !== null).length
    expect(firstIsModified / pairs.size).toBeGreaterThan(0.25)
    expect(firstIsModified / pairs.size).toBeLessThan(0.75)
  })

  it('leaves gaps, thin evidence, and enough to rank', () => {
    const cells = world.designs.flatMap(d => world.seabeds.filter(s => s.pulled).map((s) => {
      const here = world.pulls.filter(p => p.design === d.slug && p.seabed === s.slug && p.modification === null && p.fresh && entered(p))
      return { seabed: s.slug, pulls: here.length, days: new Set(here.map(p => p.trial)).size }
    }))
    const ranked = (seabed: string) => cells.filter(c => c.seabed === seabed && c.pulls >= 5 && c.days >= 2).length
    expect(cells.filter(c => c.pulls === 0).length).toBeGreaterThan(20)
    expect(cells.filter(c => c.pulls > 0 && (c.pulls < 5 || c.days < 2)).length).toBeGreaterThan(10)
    for (const seabed of ['firm-mud', 'sandy-mud', 'loose-sand']) expect(ranked(seabed), seabed).toBeGreaterThanOrEqual(12)
    for (const seabed of ['soft-mud', 'stiff-clay', 'hard-sand', 'gravel', 'cobble-over-sand', 'weed-over-sand']) expect(ranked(seabed), seabed).toBeGreaterThanOrEqual(5)
  })

  it('pulls light alloy at its mud setting on soft mud, at its sand setting elsewhere', () => {
    for (const p of world.pulls) {
      const settings = world.designs.find(d => d.slug === p.design)?.settings ?? []
      expect(p.anchorSetting).toBe(settings.length === 0 ? null : p.seabed === 'soft-mud' ? 'mud' : 'sand')
    }
    expect(count(p => p.anchorSetting === 'mud')).toBeGreaterThan(5)
  })
})
