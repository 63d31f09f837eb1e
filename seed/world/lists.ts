import type { Family, Seabed, SoilKind } from '../../shared/types/words'
import type { WorldFamily, WorldSeabed } from './types'
import { families as familySlugs, numberedSeabeds, seabeds as seabedSlugs } from '../../shared/types/words'
import { pulledSeabeds } from './truth/holding'

const familyNames: Readonly<Record<Family, string>> = {
  'hinged-plough': 'Hinged plough',
  'fixed-plough': 'Fixed plough',
  'claw': 'Claw',
  'pivoting-fluke': 'Pivoting fluke',
  'light-alloy-pivoting-fluke': 'Light-alloy pivoting fluke',
  'roll-bar-scoop': 'Roll-bar scoop',
  'weighted-tip-scoop': 'Weighted-tip scoop',
  'plain-scoop': 'Plain scoop',
  'fisherman': 'Fisherman',
  'stockless': 'Stockless',
  'grapnel': 'Grapnel',
  'other': 'Other',
}

/** All families of the product's list; the demo designs belong to nine of them. */
export const families: readonly WorldFamily[] = familySlugs.map(slug => ({ slug, name: familyNames[slug] }))

const soft: readonly Seabed[] = ['soft-mud', 'silt', 'firm-mud', 'weed-over-mud']
const numbered: readonly Seabed[] = numberedSeabeds
const pulled: readonly Seabed[] = pulledSeabeds

function soilOf(seabed: Seabed): SoilKind {
  if (!numbered.includes(seabed)) return 'none'
  if (seabed === 'sandy-mud') return 'mixed'
  return soft.includes(seabed) ? 'soft' : 'hard'
}

/** All seabeds of the product's list, with their soil kind and whether the demo world has pulls there. */
export const seabeds: readonly WorldSeabed[] = seabedSlugs.map(slug => ({
  slug,
  soil: soilOf(slug),
  numbered: numbered.includes(slug),
  pulled: pulled.includes(slug),
}))
