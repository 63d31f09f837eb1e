import type { ChartConstituent, ChartNotationAnswer } from '#shared/types/chart'
import type { Seabed } from '#shared/types/words'
import { noNumberCaution, protectedCaution } from '#shared/seabed/cautions'
import { candidates, pairCandidates, layerCandidates } from '#shared/seabed/candidates'
import { layersInWords } from '#shared/seabed/notationText'
import { isNumbered, seabedFacts } from '#shared/seabed/seabeds'

type Proposal = Pick<ChartNotationAnswer, 'seabed' | 'alternatives' | 'cautions'>

const partlyRead = 'Part of the text could not be read: the proposal rests on the rest.'
const sharesCaution = 'The order says which material is the most, not how much of it there is: the shares are for you to say.'
const firstTwo = 'The first two materials decide the proposal.'
const calcareousCaution = 'Calcareous sand may crush under a fluke and hold less than other sand (common practice, no source).'

/**
 * Proposes one of the product's seabeds for what a chart says (ours): from the first two constituents of the upper layer, and where the notation
 * one material fits several, the one that holds less.
 *
 * @param layers as read, from the top down
 * @param incomplete whether part of the text could not be read
 */
export function proposeSeabed(layers: readonly (readonly ChartConstituent[])[], incomplete: boolean): Proposal {
  const [upper, lower] = layers
  const [main, second] = upper ?? []
  if (!upper || !main) return { seabed: null, alternatives: [], cautions: [] }
  const layered = lower?.[0] && layerCandidates(main, lower[0])
  const found = layered ?? (second ? pairCandidates(main, second) : candidates(main))
  const [seabed, ...alternatives] = [...new Set(found)]
  if (!seabed) return { seabed: null, alternatives: [], cautions: [] }
  const one = !layered && !second
  const cautions = [
    ...(incomplete ? [partlyRead] : []),
    ...(layers.length > 1 ? [`Layers: ${layersInWords(layers)}. The upper one is taken; where it is thin the anchor meets what lies below.`] : []),
    ...(alternatives.length > 0 ? [choice(seabed, alternatives, one)] : []),
    ...mixtureCautions(upper.length),
    ...materialCautions(layers.flat(), seabed),
  ]
  return { seabed, alternatives, cautions }
}

function choice(seabed: Seabed, alternatives: readonly Seabed[], worse: boolean): string {
  const name = (slug: Seabed): string => seabedFacts(slug).name
  return `Taken as ${name(seabed)}${worse ? ', the worse' : ''}; it may also be ${alternatives.map(name).join(' or ')}.`
}

function mixtureCautions(constituents: number): string[] {
  if (constituents < 2) return []
  return constituents > 2 ? [sharesCaution, firstTwo] : [sharesCaution]
}

function materialCautions(all: readonly ChartConstituent[], seabed: Seabed): string[] {
  const calcareous = all.some(({ noun, qualifiers }) => noun === 'sand' && qualifiers.includes('calcareous'))
  const guarded = all.some(({ noun }) => noun === 'seagrass' || noun === 'coral')
  return [...(calcareous ? [calcareousCaution] : []), ...(guarded ? [protectedCaution] : []), ...(isNumbered(seabed) ? [] : [noNumberCaution])]
}
