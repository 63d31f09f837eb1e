import type { WorldDesign } from './types'

type Entry = Omit<WorldDesign, 'invented' | 'settings'> & { settings?: string[] }

const entries: readonly Entry[] = [
  {
    slug: 'orrelby',
    name: 'Orrelby',
    family: 'hinged-plough',
    description: 'A cast plough on a forged shank with a plain pin hinge. Old-fashioned, heavy in the shank, slow to go in.',
  },
  {
    slug: 'quennick',
    name: 'Quennick',
    family: 'hinged-plough',
    description: 'A fabricated hinged plough with a wider share and a stop that limits the swivel to about 40 degrees a side.',
  },
  {
    slug: 'haskettle',
    name: 'Haskettle',
    family: 'fixed-plough',
    description: 'A one-piece plough with a ballasted nose and a hollow shank of folded plate.',
  },
  {
    slug: 'marrowby',
    name: 'Marrowby',
    family: 'fixed-plough',
    description: 'A cast one-piece plough, narrow for its mass, made to fit tight bow rollers.',
  },
  {
    slug: 'threlpin',
    name: 'Threlpin',
    family: 'claw',
    description: 'A three-fingered casting that sets wherever it falls and holds little once it is there.',
  },
  {
    slug: 'ebbwick',
    name: 'Ebbwick',
    family: 'claw',
    description: 'A claw with shorter outer fingers, cast thick; sold as the cheapest anchor of its mass.',
  },
  {
    slug: 'dunnavet',
    name: 'Dunnavet',
    family: 'pivoting-fluke',
    description: 'Two long welded flukes on a stock through the crown, opening to 32 degrees. Lies flat on deck.',
  },
  {
    slug: 'skelloway',
    name: 'Skelloway',
    family: 'pivoting-fluke',
    description: 'Pressed flukes on a light stock, opening to 30 degrees; bends sooner than its welded kin.',
  },
  {
    slug: 'pellifrond',
    name: 'Pellifrond',
    family: 'light-alloy-pivoting-fluke',
    description: 'Machined alloy flukes bolted to a crown with two fluke angles, 32 and 45 degrees. Comes apart for stowing.',
    settings: ['sand', 'mud'],
  },
  {
    slug: 'vennimore',
    name: 'Vennimore',
    family: 'light-alloy-pivoting-fluke',
    description: 'Extruded alloy flukes with two fluke angles and palms that are shimmed out for mud.',
    settings: ['sand', 'mud'],
  },
  {
    slug: 'cawdrith',
    name: 'Cawdrith',
    family: 'roll-bar-scoop',
    description: 'A deep concave fluke with a roll bar of thick tube and a straight shank. Broad in the heel.',
  },
  {
    slug: 'ulvesk',
    name: 'Ulvesk',
    family: 'roll-bar-scoop',
    description: 'A concave fluke folded along three lines, a slim roll bar, and runners at the heel that tip the point in.',
  },
  {
    slug: 'hobbrel',
    name: 'Hobbrel',
    family: 'roll-bar-scoop',
    description: 'A flatter fluke under a wide roll bar; cheaper plate, more bar than point.',
  },
  {
    slug: 'fennigar',
    name: 'Fennigar',
    family: 'weighted-tip-scoop',
    description: 'A concave fluke with cast lead in the tip and a thin shank with a sharpened leading edge.',
  },
  {
    slug: 'osterquill',
    name: 'Osterquill',
    family: 'weighted-tip-scoop',
    description: 'A folded fluke with a solid steel tip and a dovetailed shank that lifts out.',
  },
  {
    slug: 'lapwistle',
    name: 'Lapwistle',
    family: 'plain-scoop',
    description: 'A concave fluke with neither bar nor ballast: the arched shank and the flared heel roll it upright.',
  },
  {
    slug: 'yarrowmund',
    name: 'Yarrowmund',
    family: 'plain-scoop',
    description: 'A shallow scoop on a straight shank, light in the tip; wants a gentle hand while it sets.',
  },
  {
    slug: 'gorsetter',
    name: 'Gorsetter',
    family: 'fisherman',
    description: 'A folding-stock fisherman with narrow spade palms, forged. For stones and weed, and for little else.',
  },
]

/** The invented designs. None is modelled on an existing one; names are made-up words. */
export const designs: readonly WorldDesign[] = entries.map(entry => ({
  slug: entry.slug,
  name: entry.name,
  family: entry.family,
  description: entry.description,
  invented: true,
  settings: entry.settings ?? [],
}))
