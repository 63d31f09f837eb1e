import type { PullRecord } from '#shared/types/holding'

/** A pull with invented ordinary values, changed as a test needs it. */
export function pull(changes: Partial<PullRecord> = {}): PullRecord {
  return {
    trial: 't1', design: 'd1', family: 'claw', massKg: 15, seabed: 'loose-sand', set: true, heldN: 1000, movedN: 1200, shankAngleDeg: 0,
    ...changes,
  }
}
