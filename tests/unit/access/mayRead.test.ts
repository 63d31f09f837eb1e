import { describe, expect, it } from 'vitest'
import { mayRead, visitor, type Readable } from '#shared/access/mayRead'

const everything: Readable[] = [
  { what: 'rankingRow', place: 1 },
  { what: 'rankingRow', place: 16 },
  { what: 'ownRow' },
  { what: 'thinRow' },
  { what: 'design', family: 'claw' },
  { what: 'seabed', seabed: 'rock' },
  { what: 'estimate', seabed: 'loose-sand' },
  { what: 'estimate', seabed: 'firm-mud' },
  { what: 'comparison', seabed: 'firm-mud' },
  { what: 'modification', seabed: 'loose-sand' },
]

describe('mayRead', () => {
  it.each(everything)('lets a visitor read $what', (readable) => {
    expect(mayRead(visitor, readable)).toEqual({ allowed: true })
  })
})
