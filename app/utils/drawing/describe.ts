import type { RodeAnswer } from '#shared/types/rode'
import type { Show } from '~/utils/show'

/** How the pull reaches the anchor, in one sentence. */
export function describeRode(rode: RodeAnswer, wind: string, show: Show): string {
  const lyingM = rode.groundedChainM + rode.groundedRopeM
  if (lyingM > 0.5) {
    return `At ${wind} ${show.length(lyingM, 0)} of the rode still lies on the bottom: the pull on the anchor is flat and it keeps all its holding.`
  }
  const angle = show.degrees(rode.shankAngleDeg)
  if (rode.shankAngleDeg < 1) {
    return `At ${wind} the last of the rode just lifts: the pull is within a degree of the bottom and the anchor keeps nearly all its holding.`
  }
  const keeps = show.percent(rode.upliftFactor)
  if (rode.shankAngleDeg <= 8) return `At ${wind} the rode is clear of the bottom and lifts the shank ${angle}: the anchor keeps ${keeps} of its holding.`
  return `At ${wind} the rode pulls the shank up by ${angle}: the anchor keeps only ${keeps} of its holding. Let out more, or expect less.`
}
