import { settingOf } from '#shared/trial/observation'
import type { PlainMean } from '#shared/types/fit'
import type { PullRecord } from '#shared/types/holding'

/**
 * The tester's rating: for each mass, the plain mean of the greatest load held over all pulls, failures included as 0
 * (common practice, no source). Fouled pulls enter nothing; pulls after a breakout count here as testers count them.
 *
 * @param pulls pulls of one design (or one modification of it) on one seabed
 * @returns one row a mass, lightest first; `atLeast` where any pull ended at the rig's limit or was stopped early
 */
export function plainMeans(pulls: readonly PullRecord[]): PlainMean[] {
  const rows = new Map<number, { sumN: number, pulls: number, atLeast: boolean }>()
  for (const pull of pulls) {
    if (settingOf(pull) === 'fouled') continue
    const row = rows.get(pull.massKg) ?? { sumN: 0, pulls: 0, atLeast: false }
    row.pulls += 1
    if (pull.set) {
      row.sumN += pull.heldN
      row.atLeast ||= pull.movedN === null
    }
    rows.set(pull.massKg, row)
  }
  return [...rows]
    .map(([massKg, row]) => ({ massKg, meanN: row.sumN / row.pulls, atLeast: row.atLeast, pulls: row.pulls }))
    .sort((a, b) => a.massKg - b.massKg)
}
