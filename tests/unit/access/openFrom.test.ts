import { describe, expect, it } from 'vitest'
import { isOpen, openFrom } from '#shared/access/openFrom'

describe('when a release is open', () => {
  it('is twelve months after its data were cut', () => {
    expect(openFrom('2025-09-10T18:00:00Z')).toBe('2026-09-10T18:00:00.000Z')
    expect(openFrom('2024-02-29T00:00:00Z')).toBe('2025-03-01T00:00:00.000Z')
    expect(isOpen('2025-09-10T18:00:00Z', new Date('2026-09-10T17:59:59Z'))).toBe(false)
    expect(isOpen('2025-09-10T18:00:00Z', new Date('2026-09-10T18:00:00Z'))).toBe(true)
  })
})
