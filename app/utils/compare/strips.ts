import type { ComparedHolding, ComparisonAnswer } from '#shared/types/comparison'
import type { Show } from '~/utils/show'
import { displayUnit } from '#shared/units/systems'
import type { StripRow } from '~/utils/chart/types'

/** Half-widths of the intervals drawn, in standard deviations: 90 % as given, 50 % from it. */
const [z90, z50] = [1.6449, 0.6745]

/** What an anchor of a comparison is called: its name, with its mass where the anchors differ in it. */
export function titleOf({ anchors }: Pick<ComparisonAnswer, 'anchors'>, index: number, show: Show): string {
  const anchor = anchors[index]
  if (!anchor) return ''
  return anchors.some(({ massKg }) => massKg !== anchor.massKg) ? `${anchor.name}, ${show.mass(anchor.massKg)}` : anchor.name
}

/** A holding as a strip in the reader's unit, as this rode pulls. */
export function stripRow(id: string, label: string, holding: ComparedHolding, upliftFactor: number, show: Show): StripRow {
  const unit = displayUnit('force', show.system.value).factor
  const { median, low90, high90 } = holding.holdingN
  const at = (loadN: number) => loadN * upliftFactor / unit
  const sd = Math.log(high90 / low90) / (2 * z90)
  const scaled = holding.scaledFromKg === null ? '' : `, scaled from ${show.mass(holding.scaledFromKg)}`
  const note = holding.pulls === 0 ? 'no pulls here, from its family' : `${holding.pulls} ${holding.pulls === 1 ? 'pull' : 'pulls'} on ${holding.days} ${holding.days === 1 ? 'day' : 'days'}${scaled}`
  return {
    id, label, note,
    median: at(median), low90: at(low90), high90: at(high90), low50: at(median * Math.exp(-z50 * sd)), high50: at(median * Math.exp(z50 * sd)),
    n: holding.pulls, dashed: holding.pulls < 5 || holding.days < 2, pulls: [],
  }
}
