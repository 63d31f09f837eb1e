import type { RodeInput, RodeShape } from './catenary'
import { riseOver, spanOver } from './segment'

/**
 * Points along a solved rode for drawing, from the anchor [0, 0] to the bow [spanM, heightM], m.
 *
 * A part on the bottom is its two ends; a hanging part is cut into equal lengths, chain and rope each on their own.
 *
 * @param input the rode that was solved
 * @param shape its solution
 * @param cuts pieces of each hanging part, a whole number, 1 to 1000
 * @throws RangeError for cuts outside that
 */
export function rodeCurve(input: RodeInput, shape: RodeShape, cuts = 24): [number, number][] {
  if (!(Number.isInteger(cuts) && cuts >= 1 && cuts <= 1000)) {
    throw new RangeError(`cuts must be a whole number from 1 to 1000, got ${cuts}`)
  }
  const { chain, rope, horizontalLoadN } = input
  const points: [number, number][] = [[0, 0]]
  const groundedM = shape.groundedChainM + shape.groundedRopeM
  if (groundedM > 0) points.push([groundedM, 0])
  const parts = [{ part: chain, groundedM: shape.groundedChainM }, { part: rope, groundedM: shape.groundedRopeM }]
  let foot = shape.verticalAnchorN / horizontalLoadN
  for (const { part, groundedM: lyingM } of parts) {
    const hangingM = (part?.lengthM ?? 0) - lyingM
    if (!part || hangingM <= 0) continue
    const pull = part.weightNPerM * hangingM / horizontalLoadN
    const [x0, y0] = points[points.length - 1] ?? [0, 0]
    for (let cut = 1; cut <= cuts; cut += 1) {
      const share = cut / cuts
      const slope = foot + pull * share
      points.push([x0 + spanOver(hangingM * share, foot, slope), y0 + riseOver(hangingM * share, foot, slope)])
    }
    foot += pull
  }
  points[points.length - 1] = [shape.spanM, input.heightM]
  return points
}
