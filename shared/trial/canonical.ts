import { sha256 } from '#shared/trial/sha256'
import type { PullRecord } from '#shared/types/holding'

/** One pull as a line of text: every field in a fixed order, numbers in their shortest exact form. */
export function canonicalLine(pull: PullRecord): string {
  return JSON.stringify([
    pull.seabed, pull.trial, pull.design, pull.modification ?? null, pull.massKg, pull.family, pull.rig ?? null,
    pull.calibrationSd ?? null, pull.set, pull.heldN, pull.movedN, pull.shankAngleDeg, pull.setting ?? null, pull.end ?? null,
    pull.after ?? null, pull.veer ?? null, pull.fresh ?? true, pull.pair ?? null,
  ])
}

function byText(a: string, b: string): number {
  if (a === b) return 0
  return a < b ? -1 : 1
}

/** The pulls in their one canonical order (by text, code unit by code unit), whatever order they came in. */
export function canonicalOrder(pulls: readonly PullRecord[]): PullRecord[] {
  return pulls
    .map(pull => ({ pull, line: canonicalLine(pull) }))
    .sort((a, b) => byText(a.line, b.line))
    .map(({ pull }) => pull)
}

/**
 * Name of a set of pulls by its content: SHA-256 over their canonical lines in canonical order. The same pulls in any order give
 * the same 64 hexadecimal digits.
 */
export function dataHash(pulls: readonly PullRecord[]): string {
  return sha256(pulls.map(canonicalLine).sort(byText).join('\n'))
}
