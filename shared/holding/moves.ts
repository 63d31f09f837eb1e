import type { EstimateMove, ReleaseChanges } from '#shared/types/release'
import type { NumberedSeabed } from '#shared/types/words'

/** What a fit says of one design on one seabed: ln N at 15 kg, flat pull. */
export interface Holding { design: string, name: string, seabed: NumberedSeabed, lnMean: number, lnSd: number, pulls: number }

/** Half width of a 90 % interval in standard deviations. */
const z90 = 1.6448536269514722

/** A median that moved by more than this share either way moved much. Ours. */
export const muchShare = 0.15

const keyOf = ({ design, seabed }: Holding) => `${seabed}/${design}`

function figures({ lnMean, lnSd, pulls }: Holding): EstimateMove['before'] {
  return { median: Math.exp(lnMean), low90: Math.exp(lnMean - z90 * lnSd), high90: Math.exp(lnMean + z90 * lnSd), pulls }
}

function middle(values: readonly number[]): number | null {
  const sorted = [...values].sort((a, b) => a - b)
  const [low, high] = [sorted[Math.ceil(sorted.length / 2) - 1], sorted[Math.floor(sorted.length / 2)]]
  return low === undefined || high === undefined ? null : (low + high) / 2
}

const size = ({ ratio }: EstimateMove) => Math.abs(Math.log(ratio))

type Moves = Pick<ReleaseChanges, 'compared' | 'added' | 'movedMuch' | 'outside' | 'widthRatio' | 'largest'>

/**
 * How the estimates of one fit moved in the next: those that both give, compared in ln load; the `most` that moved furthest, furthest first.
 * `widthRatio` is the middle of the ratios of the intervals' widths in ln load, after over before.
 */
export function movesBetween(before: readonly Holding[], after: readonly Holding[], most = 5): Moves {
  const earlier = new Map(before.map(one => [keyOf(one), one]))
  const both = after.flatMap((now) => {
    const then = earlier.get(keyOf(now))
    return then ? [{ now, then, move: { design: now.design, name: now.name, seabed: now.seabed, before: figures(then), after: figures(now), ratio: Math.exp(now.lnMean - then.lnMean) } }] : []
  })
  const moves = both.map(({ move }) => move)
  const outside = both.filter(({ now, then }) => Math.abs(now.lnMean - then.lnMean) > z90 * then.lnSd)
  return {
    compared: both.length,
    added: after.length - both.length,
    movedMuch: moves.filter(({ ratio }) => ratio > 1 + muchShare || ratio < 1 / (1 + muchShare)).length,
    outside: outside.length,
    widthRatio: middle(both.map(({ now, then }) => now.lnSd / then.lnSd)),
    largest: moves.toSorted((a, b) => size(b) - size(a) || (a.seabed + a.design < b.seabed + b.design ? -1 : 1)).slice(0, most),
  }
}
