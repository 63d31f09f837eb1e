import * as z from 'zod/mini'
import { foulings, numberedSeabeds, pullEnds, settingOutcomes } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { rankingRequest } from '../ranking'
import { count, figure, flag, list, words } from './figures'
import { fitName, holdingWind } from './ranking'

const span = (unit: string, description: string) => fieldsOf({
  median: figure(unit, 'Median'), low90: figure(unit, 'Lower end of the 90 % interval'), high90: figure(unit, 'Upper end of the 90 % interval'),
}, description)

const price = z.nullable(fieldsOf({ minor: z.int().check(z.describe('In minor units')), currency: words('ISO 4217'), on: words('Date of the price') }, 'Price; null: not stated'))
const verdict = z.nullable(z.enum(['better', 'worse', 'noDifference', 'cannotTell']))
const seabed = z.enum(numberedSeabeds)

const ratio = fieldsOf({
  design: words('Slug of the design'),
  seabed,
  ratio: span('', 'Modified over unmodified holding'),
  pulls: count('Modified pulls in the fit'),
  pairs: count('Back-to-back pairs; without them there is no verdict'),
  verdict,
}, 'One design on one seabed')

const listing = fieldsOf({
  slug: words('Slug'),
  name: words('Name'),
  description: words('What was changed'),
  addedMassKg: z.nullable(figure('kg', 'What it adds to an anchor of 20 kg; null: not stated')),
  price,
  designs: list(fieldsOf({ slug: words('Slug'), name: words('Name') }, 'A design'), 'Designs it was tried on'),
  ratios: list(ratio, 'What the pulls say, a seabed each'),
}, 'A modification')

export const modificationsAnswer = fieldsOf({
  fit: fitName,
  modifications: list(listing, 'By name'),
  hidden: count('Ratios that the asker may not read'),
}, 'Modifications')

const side = list(fieldsOf({
  massKg: figure('kg', 'Mass'),
  setting: z.enum(settingOutcomes),
  heldN: figure('N', 'Held'),
  movedN: z.nullable(figure('N', 'Moved; null: the rig\'s limit, stopped early or never set')),
  end: z.nullable(z.enum(pullEnds)),
  fouling: z.enum(foulings),
}, 'A pull'), 'Pulls of this side, in the order made')

const worth = fieldsOf({
  massKg: figure('kg', 'Mass of the anchor'),
  loadN: z.nullable(figure('N', 'Survey load of the plan; null where the rode cannot bound it')),
  upliftFactor: z.nullable(figure('', 'Share of holding that the plan\'s shank angle leaves')),
  seabeds: list(fieldsOf({
    design: words('Slug of the design'),
    seabed,
    unmodifiedN: span('N', 'Holding of the unmodified anchor as this rode pulls'),
    changeN: span('N', 'Added to that by the ratio, or taken away'),
    unmodifiedWind: z.nullable(holdingWind),
    changeMs: z.nullable(fieldsOf({ mean: span('m/s', 'As mean'), gust: span('m/s', 'As gust'), capped: flag('A wind past 64 kn was counted as 64 kn') }, 'Change of the wind at which nine of ten hold')),
    sameAsKg: span('kg', 'Unmodified anchor that would hold as much'),
    verdict,
  }, 'On one seabed'), 'Every seabed it was tried on'),
}, 'What the change is worth for a plan')

export const modificationAnswer = fieldsOf({
  fit: fitName,
  modification: listing,
  pairs: list(fieldsOf({
    trial: words('Slug of the trial'), day: words('Day'), place: words('Place'), design: words('Slug of the design'), seabed, modified: side, unmodified: side,
  }, 'A back-to-back pair: same day, within 50 m, alternated'), 'The newest pairs'),
  pairsInAll: count('Pairs on record'),
  cohesive: z.nullable(words('Mud and clay against sand and gravel; null where the pulls do not say it')),
  worth,
  reference: rankingRequest,
  sizes: list(fieldsOf({ design: words('Slug of the design'), massKg: figure('kg', 'Mass'), price }, 'A size'), 'Sizes of its designs, lightest first'),
  hidden: count('Ratios that the asker may not read'),
}, 'A modification, for a reference plan')

export const modificationWorthAnswer = fieldsOf({ fit: fitName, modification: words('Slug'), worth }, 'What a modification is worth for a plan')
