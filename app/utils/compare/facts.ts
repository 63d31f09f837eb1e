import type { ComparedHolding, ComparisonAnswer, EndCounts } from '#shared/types/comparison'
import type { Share } from '#shared/types/holding'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { Show } from '~/utils/show'
import { priceInWords } from '~/utils/money'
import { familyNames, windCell } from '~/utils/ranking'

/** A row of a table whose columns are the anchors. */
export interface FactRow { label: string, cells: string[] }

const endWords: readonly [keyof EndCounts, string][] = [
  ['atTheLimit', 'held to the rig’s limit'], ['stoppedEarly', 'stopped early'], ['crept', 'crept'], ['dragged', 'dragged'], ['brokeOut', 'broke out'],
  ['neverSet', 'never set'], ['fouled', 'fouled'],
]

/** `of 8 pulls 6 dragged, 2 never set`; that there are none. */
export function endsInWords(ends: EndCounts | null): string {
  if (ends === null || ends.pulls === 0) return 'no pulls here'
  const parts = endWords.filter(([end]) => ends[end] > 0).map(([end, words]) => `${ends[end]} ${words}`)
  return `of ${ends.pulls} ${ends.pulls === 1 ? 'pull' : 'pulls'}: ${parts.join(', ')}`
}

/** `62 % (44 to 79 %, n 8)`, or what is said where nothing was tried. */
export function shareInWords(share: Share | null, none: string, show: Show): string {
  if (share === null || share.n === 0) return none
  return `${show.percent(share.mean)} (${Math.round(share.low90 * 100)} to ${Math.round(share.high90 * 100)} %, n ${share.n})`
}

function windWords(wind: ComparedHolding['holdingWind'], show: Show): string {
  const { mean, gust } = windCell(wind, show)
  return gust ? `mean ${mean}, ${gust}` : mean
}

/** What each anchor is: family, mass, price, and what it does over the plan's mix. */
export function anchorFacts({ anchors }: ComparisonAnswer, planned: boolean, show: Show): FactRow[] {
  const rows: FactRow[] = [
    { label: 'Family', cells: anchors.map(({ family }) => familyNames[family]) },
    { label: 'Mass', cells: anchors.map(({ massKg }) => show.mass(massKg)) },
    { label: 'Price', cells: anchors.map(({ size }) => size === null ? 'not made in this mass' : priceInWords(size.price)) },
    { label: 'Material', cells: anchors.map(({ size }) => size?.material ?? 'not stated') },
  ]
  if (!planned) return rows
  return [
    ...rows,
    { label: 'Worst seabed of the mix', cells: anchors.map(({ worst }) => worst ? seabedFacts(worst.seabed).name : 'not known') },
    { label: 'Holding wind there', cells: anchors.map(({ worst }) => windWords(worst?.holdingWind ?? null, show)) },
    { label: 'Chance over the mix, once set', cells: anchors.map(({ weightedChance }) => weightedChance === null ? '–' : show.percent(weightedChance)) },
  ]
}

/** What each anchor does on one seabed, and how it fails there. */
export function mannerFacts(holdings: readonly (ComparedHolding | null)[], planned: boolean, show: Show): FactRow[] {
  const row = (label: string, cell: (holding: ComparedHolding) => string): FactRow => ({ label, cells: holdings.map(holding => holding ? cell(holding) : '–') })
  return [
    ...(planned
      ? [
          row('Chance once set', ({ chance }) => chance === null ? '–' : show.percent(chance)),
          row('Holding wind', ({ holdingWind }) => windWords(holdingWind, show)),
        ]
      : []),
    row('Set at the first try', ({ setShare }) => shareInWords(setShare, 'not known', show)),
    row('How the pulls ended', ({ ends }) => endsInWords(ends)),
    row('Reset after a breakout', ({ resetShare }) => shareInWords(resetShare, 'never seen', show)),
    row('Kept through a wind shift', ({ veer }) => shareInWords(veer, 'not tested for a wind shift', show)),
  ]
}
