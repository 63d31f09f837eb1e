import type { PullRecord } from '#shared/types/holding'
import type { ReleasePull } from '#shared/types/release'
import type { Family } from '#shared/types/words'

/** What the fit needs to know of a pull beyond the pull itself. */
export interface PullContext { family: Family, rig: string, calibrationSd: number | null }

/** A pull of a release as the fit takes it. Whoever downloads a release turns its rows into the same records. */
export function pullRecord(pull: ReleasePull, { family, rig, calibrationSd }: PullContext): PullRecord {
  const { trial, design, massKg, seabed, modification, setting, heldN, movedN, shankAngleDeg, fresh, end, after, veer, pair } = pull
  return {
    trial, rig, design, family, massKg, seabed, setting, heldN, movedN, shankAngleDeg,
    set: setting === 'set' || setting === 'setAfterDragging',
    ...calibrationSd === null ? {} : { calibrationSd },
    ...modification === null ? {} : { modification },
    ...fresh ? {} : { fresh },
    ...end === null ? {} : { end },
    ...end === null ? {} : { end },
    ...after === null ? {} : { after },
    ...veer === null ? {} : { veer },
    ...pair === null ? {} : { pair },
  }
}
