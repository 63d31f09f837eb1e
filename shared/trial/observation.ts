import type { PullRecord } from '#shared/types/holding'
import type { SettingOutcome } from '#shared/types/words'

/** What a pull says of the holding: it lies from `heldN` to `movedN` (Infinity: the rig's limit, or stopped early). */
export interface HeldInterval { heldN: number, movedN: number }

/** How the anchor set; without a recorded outcome, `set` alone decides. */
export function settingOf(pull: PullRecord): SettingOutcome {
  return pull.setting ?? (pull.set ? 'set' : 'neverSet')
}

/**
 * True for a pull that stands for itself: not fouled, and not made after a breakout in the same deployment. Such a later pull
 * starts in ground that the first one has ploughed and with an anchor that may be clogged; it says whether the anchor reset
 * (recorded as `after` of the first pull), and is not a second independent pull. Ours.
 */
export function standsAlone(pull: PullRecord): boolean {
  return settingOf(pull) !== 'fouled' && pull.fresh !== false
}

/**
 * The interval a pull puts its holding in, loads in N; null for one that enters no fit: fouled, never set, or not fresh.
 * held <= H < moved; at the limit or stopped early H >= held; moved at the first step 0 < H < moved.
 */
export function heldInterval(pull: PullRecord): HeldInterval | null {
  if (!standsAlone(pull) || settingOf(pull) === 'neverSet') return null
  return { heldN: pull.heldN, movedN: pull.movedN ?? Infinity }
}

/**
 * One load for a pull, N, for centring only: sqrt(held x moved); half of moved where held is 0; held where moved is none.
 */
export function middleLoadN({ heldN, movedN }: HeldInterval): number {
  if (movedN === Infinity) return heldN
  return heldN === 0 ? movedN / 2 : Math.sqrt(heldN * movedN)
}

/**
 * Whether a pull that never moved was ended by the rig's limit, and not stopped before it. Where its end is not on record, a pull
 * that never moved counts.
 */
export function endedAtLimit(pull: Pick<PullRecord, 'movedN' | 'end'>): boolean {
  return pull.movedN === null && (pull.end === undefined || pull.end === 'atTheLimit')
}
