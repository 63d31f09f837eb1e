import type { BoatType, Seabed } from '#shared/types/words'
import { boatOutline } from '~/utils/drawing/boatOutline'
import { lengthOf, pathThrough, resample, splitAt } from '~/utils/drawing/polyline'
import type { Point } from '~/utils/drawing/polyline'

/** What is drawn, all in metres and degrees; the curve runs from the anchor [0, 0] to the bow. */
export interface ElevationInput {
  curve: readonly Point[]
  heightM: number
  waterM: number
  chainM: number
  ropeM: number
  snubberM: number
  groundedM: number
  shankAngleDeg: number
  boat: { type: BoatType, lengthM: number, bowHeightM: number }
  seabeds: readonly { seabed: Seabed, share: number }[]
}

/** Paper to draw on: greatest width and height, least sky above the water, in drawing units; share of the boat's length shown. */
export interface Sheet { width: number, height: number, sky: number, bed: number, margin: number, boatShare: number }

export const wideSheet: Sheet = { width: 1100, height: 560, sky: 150, bed: 46, margin: 26, boatShare: 1.02 }
export const narrowSheet: Sheet = { width: 380, height: 420, sky: 118, bed: 30, margin: 12, boatShare: 0.62 }

export interface BedSegment { seabed: Seabed, x: number, width: number }

export interface Elevation {
  width: number
  height: number
  /** drawing units per metre: one scale for both directions */
  scale: number
  surfaceY: number
  bedY: number
  bed: BedSegment[]
  anchor: Point
  bow: Point
  groundedEndX: number
  chain: string
  rope: string
  snubber: string
  slack: string
  boat: { hull: string, below: string, house: string[], rig: string[] }
}

function bedSegments(seabeds: ElevationInput['seabeds'], width: number): BedSegment[] {
  const total = seabeds.reduce((sum, { share }) => sum + share, 0) || 1
  let x = 0
  return seabeds.map(({ seabed, share }) => {
    const segment = { seabed, x: tenth(x), width: tenth(width * share / total) }
    x += width * share / total
    return segment
  })
}

/** The snubber takes the last of the rode straight; the chain it relieves hangs in a slack loop below it. */
function snubbed(points: readonly Point[], snubberM: number): { rode: Point[], snubber: Point[] } {
  const [rode, last] = snubberM > 0 ? splitAt(points, lengthOf(points) - snubberM) : [[...points], []]
  return rode.length < 2 || last.length < 2 ? { rode: [...points], snubber: [] } : { rode, snubber: last }
}

/** To a tenth of a unit: finer is not seen, and two machines' last digits must not make two drawings. */
const tenth = (value: number): number => Math.round(value * 10) / 10

/**
 * Lays the whole scene out to scale: the same number of units for a metre across and up.
 *
 * @param input what is drawn
 * @param sheet the paper
 * @returns path data and positions in drawing units, y downward
 */
export function layElevation(input: ElevationInput, sheet: Sheet): Elevation {
  const { boat, curve, waterM } = input
  const spanM = curve[curve.length - 1]?.[0] ?? 0
  const acrossM = spanM + boat.lengthM * sheet.boatShare
  const fitting = (sheet.width - sheet.margin * 2) / acrossM
  const scale = Math.min(fitting, (sheet.height - sheet.bed - sheet.sky) / waterM)
  const sky = Math.max(sheet.sky, Math.min((boat.bowHeightM + boat.lengthM * 0.62) * scale, sheet.sky * 1.5))
  const surfaceY = tenth(sky)
  const bedY = tenth(sky + waterM * scale)
  const left = sheet.margin + (fitting - scale) * acrossM / 2
  const place = ([x, y]: Point): Point => [tenth(left + x * scale), tenth(bedY - y * scale)]
  const placeBoat = ([x, y]: Point): Point => place([spanM + x, waterM + y])

  const [chainPart, ropePart] = splitAt(curve, input.ropeM > 0 ? input.chainM : Infinity)
  const sag = Math.min(input.snubberM * 0.09, waterM * 0.12)
  const upper = snubbed(ropePart.length > 1 ? ropePart : chainPart, input.snubberM)
  const draw = (points: readonly Point[]): string => pathThrough(resample(points, 64).map(place))
  const upperPath = draw(upper.rode)
  const outline = boatOutline(boat.type, boat.lengthM, boat.bowHeightM)
  const [slackFrom, slackTo] = [upper.snubber[0], upper.snubber[upper.snubber.length - 1]]

  return {
    width: sheet.width,
    height: bedY + sheet.bed,
    scale,
    surfaceY,
    bedY,
    bed: bedSegments(input.seabeds, sheet.width),
    anchor: place([0, 0]),
    bow: place([spanM, input.heightM]),
    groundedEndX: place([input.groundedM, 0])[0],
    chain: ropePart.length > 1 ? draw(chainPart) : upperPath,
    rope: ropePart.length > 1 ? upperPath : '',
    snubber: upper.snubber.length > 1 ? pathThrough(resample(upper.snubber, 12).map(place)) : '',
    slack: slackFrom && slackTo ? slackLoop(place(slackFrom), place(slackTo), sag * scale) : '',
    boat: {
      hull: `${pathThrough(outline.hull.map(placeBoat))}Z`,
      below: pathThrough(outline.below.map(placeBoat)),
      house: outline.house.map(line => pathThrough(line.map(placeBoat))),
      rig: outline.rig.map(line => pathThrough(line.map(placeBoat))),
    },
  }
}

function slackLoop(from: Point, to: Point, sag: number): string {
  const middle: Point = [(from[0] + to[0]) / 2 + sag, (from[1] + to[1]) / 2 + sag * 2]
  return `${pathThrough([from])}Q${middle[0].toFixed(1)} ${middle[1].toFixed(1)} ${to[0].toFixed(1)} ${to[1].toFixed(1)}`
}
