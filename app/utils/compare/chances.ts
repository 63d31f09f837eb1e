import type { ComparedPair, ComparedSeabed, ComparisonAnswer } from '#shared/types/comparison'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { Show } from '~/utils/show'
import type { ChartTableRow, MatrixCell, MatrixColumn, MatrixRow } from '~/utils/chart/types'
import { titleOf } from '~/utils/compare/strips'
import { patternId } from '~/utils/seabedTiles'

/** A matrix of chances with its table of numbers and its finding. */
export interface ChanceTable { columns: MatrixColumn[], rows: MatrixRow[], numbers: ChartTableRow[], finding: string }

/** Chances at which a cell grows darker: the ends of the coin-toss and of "very likely". */
const steps = [0.1, 0.35, 0.65, 0.9] as const

const levelOf = (chance: number) => steps.filter(step => chance >= step).length as MatrixCell['level']

function cellOf({ holdings }: ComparedSeabed, pair: ComparedPair | undefined, show: Show): MatrixCell | null {
  if (pair === undefined || pair.verdict === 'notTested') return null
  const n = Math.min(holdings[pair.first]?.pulls ?? 0, holdings[pair.second]?.pulls ?? 0)
  return { text: show.percent(pair.chance), level: levelOf(pair.chance), n }
}

/** How often anything can be told, in one sentence. */
function findingOf({ seabeds }: ComparisonAnswer): string {
  const pairs = seabeds.flatMap(entry => entry.pairs)
  const count = (verdict: ComparedPair['verdict']) => pairs.filter(pair => pair.verdict === verdict).length
  const told = count('veryLikely') + count('moreLikely')
  const rest = [
    ...count('cannotTell') > 0 ? [`${count('cannotTell')} of them a coin-toss`] : [],
    ...count('notTested') > 0 ? [`${count('notTested')} with too few pulls to judge`] : [],
  ]
  return `Of ${pairs.length} comparisons of true medians, one is ahead in ${told}, in ${count('veryLikely')} very likely${rest.length > 0 ? `; ${rest.join(', ')}` : ''}.`
}

/** Every two anchors of a comparison on every seabed: the chance that the first's median holding is the higher one. */
export function chanceTable(answer: ComparisonAnswer, show: Show): ChanceTable {
  const { anchors, seabeds } = answer
  const couples = anchors.flatMap((_, first) => anchors.slice(first + 1).map((__, offset) => [first, first + 1 + offset] as const))
  const label = ([first, second]: readonly [number, number]) => `${titleOf(answer, first, show)} over ${titleOf(answer, second, show)}`
  const pairOn = (seabed: ComparedSeabed, [first, second]: readonly [number, number]) => seabed.pairs.find(pair => pair.first === first && pair.second === second)
  return {
    columns: seabeds.map(({ seabed }) => ({ label: seabedFacts(seabed).name, pattern: patternId(seabed) })),
    rows: couples.map(couple => ({ label: label(couple), cells: seabeds.map(seabed => cellOf(seabed, pairOn(seabed, couple), show)) })),
    numbers: couples.map(couple => ({
      pair: label(couple),
      ...Object.fromEntries(seabeds.map((entry) => {
        const pair = pairOn(entry, couple)
        return [entry.seabed, pair ? Number(pair.chance.toFixed(3)) : null]
      })),
    })),
    finding: findingOf(answer),
  }
}
