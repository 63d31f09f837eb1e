import type { HoldingWind, RankedRow, RankedSeabed, RankingAnswer } from '#shared/types/ranking'
import type { Family } from '#shared/types/words'
import type { Show } from '~/utils/show'
import { logScale, roundValues } from '~/utils/scale'

export const familyNames: Readonly<Record<Family, string>> = {
  'hinged-plough': 'hinged plough', 'fixed-plough': 'fixed plough', 'claw': 'claw', 'pivoting-fluke': 'pivoting fluke',
  'light-alloy-pivoting-fluke': 'light-alloy pivoting fluke', 'roll-bar-scoop': 'roll-bar scoop', 'weighted-tip-scoop': 'weighted-tip scoop',
  'plain-scoop': 'plain scoop', 'fisherman': 'fisherman', 'stockless': 'stockless', 'grapnel': 'grapnel', 'other': 'other',
}

/** Half-widths of the intervals drawn, in standard deviations: 90 % as given, 50 % from it. */
const [z90, z50] = [1.6449, 0.6745]

/** A strip as drawn: holding as this rode pulls, N. */
export interface Strip { median: number, low50: number, high50: number, low90: number, high90: number }

/** Holding of one design on one seabed at the shank's angle: the interval of the flat pull, times the uplift factor. */
export function stripOf({ holdingN, upliftFactor }: RankedSeabed): Strip | null {
  if (!holdingN) return null
  const { median, low90, high90 } = holdingN
  const sd = Math.log(high90 / low90) / (2 * z90)
  return {
    median: median * upliftFactor, low90: low90 * upliftFactor, high90: high90 * upliftFactor,
    low50: median * Math.exp(-z50 * sd) * upliftFactor, high50: median * Math.exp(z50 * sd) * upliftFactor,
  }
}

/** The entry that decides a row: its worst seabed, else the first with a number. */
export const worstOf = (row: RankedRow): RankedSeabed | undefined =>
  row.seabeds.find(({ seabed }) => seabed === row.worst?.seabed) ?? row.seabeds.find(({ holdingN }) => holdingN !== null)

/** One scale for every strip on the page, logarithmic, in per cent of the strip's width, with round ticks in the reader's unit. */
export interface StripScale { at: (loadN: number) => number, ticks: { x: number, text: string }[] }

/**
 * @param answer every row's strips and the load must fit
 * @param unitN newtons in one unit of the axis
 */
export function stripScale(answer: RankingAnswer, unitN: number): StripScale {
  const rows = [...answer.rows, ...answer.thin, ...(answer.own ? [answer.own.row] : [])]
  const strips = rows.flatMap(row => row.seabeds.map(stripOf)).filter(strip => strip !== null)
  const loadN = answer.load.survey.totalN ?? 1000
  const low = Math.max(Math.min(loadN, ...strips.map(strip => strip.low90)) * 0.85, 20)
  const high = Math.max(loadN, ...strips.map(strip => strip.high90), low * 2) * 1.15
  const at = logScale(low, high)
  return { at, ticks: roundValues(low * 1.05 / unitN, high / 1.05 / unitN).map(value => ({ x: at(value * unitN), text: String(value) })) }
}

/** A holding wind in short, for a table cell. */
export function windCell(wind: HoldingWind | null, show: Show): { mean: string, gust: string } {
  if (wind === null) return { mean: '–', gust: '' }
  if ('reason' in wind) return wind.reason === 'beyond64kn' ? { mean: 'past 64 kn', gust: '' } : { mean: 'not in calm', gust: '' }
  return { mean: `${wind.atLeast ? '≥ ' : ''}${show.holdingSpeed(wind.meanMs)}`, gust: `gusting ${show.holdingSpeed(wind.gustMs)}` }
}

export type Bracket = 'start' | 'middle' | 'end' | null

/** Which part of a bracket each row carries: rows tied with the next are joined. */
export function brackets(rows: readonly RankedRow[]): Bracket[] {
  return rows.map((row, index) => {
    const above = rows[index - 1]?.tiedWithNext === true
    const below = row.tiedWithNext && index < rows.length - 1
    if (above && below) return 'middle'
    return above ? 'end' : below ? 'start' : null
  })
}
