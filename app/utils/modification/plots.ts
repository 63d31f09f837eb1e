import type { ModificationListing, PairSide } from '#shared/types/modification'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { Show } from '~/utils/show'
import type { RatioRow } from '~/utils/chart/types'
import { verdictWords } from '~/utils/modification/words'
import { patternId } from '~/utils/seabedTiles'

/** Ratios as the plot draws them: a row a seabed, the design in front where it was tried on several. */
export function ratioRows({ ratios, designs }: ModificationListing): RatioRow[] {
  const nameOf = (slug: string) => designs.find(design => design.slug === slug)?.name ?? slug
  return ratios.map(({ design, seabed, ratio, pulls, verdict }) => ({
    label: designs.length > 1 ? `${nameOf(design)}, ${seabedFacts(seabed).name}` : seabedFacts(seabed).name,
    pattern: patternId(seabed),
    ratio: ratio.median, low90: ratio.low90, high90: ratio.high90, n: pulls, verdict: verdictWords(verdict),
  }))
}

/** One side of a pair in words: `held 1.3 kN, moved at 1.5 kN`, `held 4.5 kN, the rig’s limit`, `never set`. */
export function sideWords(pulls: readonly PairSide[], show: Show): string {
  const one = ({ setting, heldN, movedN, end }: PairSide): string => {
    if (setting === 'neverSet') return 'never set'
    if (setting === 'fouled') return 'fouled'
    const after = setting === 'setAfterDragging' ? ', set after dragging' : ''
    if (movedN === null) return `held ${show.force(heldN)}, ${end === 'stoppedEarly' ? 'stopped early' : 'the rig’s limit'}${after}`
    return `${heldN === 0 ? 'moved at the first step' : `held ${show.force(heldN)}, moved at ${show.force(movedN)}`}${after}`
  }
  return pulls.length === 0 ? '–' : pulls.map(one).join('; ')
}
