import { describe, expect, it } from 'vitest'
import { visitor, type mayRead } from '#shared/access/mayRead'
import type { RankedRow, RankingAnswer } from '#shared/types/ranking'
import { readableRanking } from '../../../server/services/rankings'

const row = (design: string, rank: number | null) => ({ design, rank }) as RankedRow

const whole = {
  massKg: 15,
  rows: [row('north', 1), row('south', 2), row('east', 3)],
  thin: [row('west', null), row('middle', null)],
  own: { row: row('east', 3), verdict: 'holds' },
  hidden: 0,
} as RankingAnswer

describe('what of a ranking is read', () => {
  it('is all of it for now', () => {
    expect(readableRanking(visitor, whole)).toEqual(whole)
  })

  it('is as much as one function allows; the rest is counted, not shown', () => {
    const may: typeof mayRead = (_actor, wanted) => {
      const allowed = wanted.what === 'ownRow' || (wanted.what === 'rankingRow' && wanted.place <= 1)
      return allowed ? { allowed } : { allowed, reason: 'for those with full data' }
    }
    const read = readableRanking(visitor, whole, may)
    expect(read.rows.map(({ design }) => design)).toEqual(['north'])
    expect(read.thin).toEqual([])
    expect(read.own).toEqual(whole.own)
    expect(read.hidden).toBe(4)
    expect(read.massKg).toBe(15)
    expect(JSON.stringify({ ...read, own: null })).not.toMatch(/south|east|west|middle/)
  })
})
