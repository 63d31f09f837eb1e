import * as z from 'zod/mini'
import { families, numberedSeabeds, seabeds, soilKinds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, figure, flag, interval, list, share, words } from './figures'
import { fitName } from './ranking'

const stated = <T extends z.core.SomeType>(fact: T) => z.nullable(fact)

export const size = fieldsOf({
  massKg: figure('kg', 'Mass'),
  shankLengthMm: stated(figure('mm', 'Shank length')),
  flukeWidthMm: stated(figure('mm', 'Fluke width')),
  overallHeightMm: stated(figure('mm', 'Overall height')),
  shackleHoleMm: stated(figure('mm', 'Shackle hole')),
  material: stated(z.string()),
  shankStrengthN: stated(figure('N', 'Shank strength')),
  finish: stated(z.string()),
  stowsFlat: stated(z.boolean()),
  price: stated(fieldsOf({ minor: count('In minor units'), currency: words('ISO 4217'), on: words('Date of the price') }, 'Price')),
}, 'A mass of the design; null: not stated')

export const designListing = fieldsOf({
  slug: words('Slug'),
  name: words('Name'),
  family: z.enum(families),
  familyName: words('Family in words'),
  description: words('Description'),
  settings: list(z.string(), 'Fluke angles or the like that its maker provides'),
  invented: flag('A design of the demo world'),
  sizes: list(size, 'Sizes, lightest first'),
}, 'An anchor design')

export const seabedListing = fieldsOf({
  slug: z.enum(seabeds),
  name: words('Name'),
  soil: z.enum(soilKinds),
  numbered: flag('Can carry a holding figure'),
  description: words('Description'),
  notation: words('As a chart would print it'),
  cautions: list(z.string(), 'Cautions'),
}, 'A seabed')

export const seabedsAnswer = fieldsOf({ seabeds: list(seabedListing, 'Seabeds') }, 'The seabeds')

export const estimatesAnswer = fieldsOf({
  fit: z.extend(fitName, { dataHash: words('Hash of the pulls') }),
  sigma: figure('ln load', 'Spread between single pulls'),
  estimates: list(fieldsOf({
    design: words('Slug of the design'),
    family: z.enum(families),
    seabed: z.enum(numberedSeabeds),
    lnMean15Kg: figure('', 'ln of holding in N at 15 kg, flat pull, perfect rig'),
    lnSd: figure('', 'Its standard deviation'),
    holding15KgN: interval,
    pulls: count('Pulls; 0: from the family, wider'),
    days: count('Days they were made on'),
    atLimit: count('Of them at the rig\'s limit'),
    massRangeKg: z.nullable(z.tuple([z.number(), z.number()])),
    mostShown15KgN: z.nullable(figure('N', 'Most that any pull here held, scaled to 15 kg and a flat pull')),
    setShare: z.nullable(share),
    resetShare: z.nullable(share),
    veerShare: z.nullable(share),
  }, 'One design on one seabed'), 'Estimates'),
}, 'What the newest fit says')
