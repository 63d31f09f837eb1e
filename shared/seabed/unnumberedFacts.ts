import type { UnnumberedSeabed } from '#shared/types/words'
import type { SeabedFacts } from '#shared/seabed/facts'
import { noNumberCaution, protectedCaution } from '#shared/seabed/cautions'

/** Seabeds that never carry a number. Descriptions are common practice, no source. */
export const unnumberedFacts: Readonly<Record<UnnumberedSeabed, SeabedFacts>> = {
  'thick-weed': {
    name: 'thick weed',
    soil: 'none',
    numbered: false,
    description: 'Kelp or a dense mat of weed that hides the bottom. Most anchors lie on top or rake up a bundle; what holds for a while is the weed\'s own roots, and they let go without warning.',
    notation: 'Wd',
    patterns: ['tufts'],
    cautions: [noNumberCaution],
  },
  'seagrass': {
    name: 'seagrass',
    soil: 'none',
    numbered: false,
    description: 'A meadow of flowering plants rooted in a tough mat. Anchors tear it rather than bury in it, and a torn patch may take decades to grow back.',
    notation: 'Sg',
    patterns: ['tufts', 'tufts'],
    cautions: [protectedCaution, noNumberCaution],
  },
  'rock': {
    name: 'rock',
    soil: 'none',
    numbered: false,
    description: 'Bare rock, ledges or boulders. An anchor may hook a crack and hold anything, or slide; which of the two cannot be known beforehand, and getting it back may need a tripping line.',
    notation: 'R',
    patterns: ['hatch'],
    cautions: [noNumberCaution],
  },
  'coral': {
    name: 'coral',
    soil: 'none',
    numbered: false,
    description: 'Living or dead reef. Anchors hook or slide as on rock, chain wraps round the heads and chafes, and both destroy what took centuries to build.',
    notation: 'Co',
    patterns: ['hatch', 'circles'],
    cautions: [protectedCaution, noNumberCaution],
  },
}
