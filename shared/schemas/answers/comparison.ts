import * as z from 'zod/mini'
import { families, seabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { size } from './catalogue'
import { count, figure, interval, list, share, words } from './figures'
import { fitName, holdingWind } from './ranking'

const place = (description: string) => count(`${description}, by its place in the list asked for; 0 the first`)

const pair = fieldsOf({
  first: place('One anchor'),
  second: place('The other'),
  chance: figure('', 'Chance that the first\'s true median is the higher one, from the joint covariance'),
  oneTry: figure('', 'Chance that the first holds more when each is pulled once, side by side on one day'),
  ratio: fieldsOf({ median: figure('', 'Median'), low90: figure('', 'Lower end of the 90 % interval'), high90: figure('', 'Upper end of the 90 % interval') }, 'First\'s median over the second\'s'),
  verdict: z.enum(['veryLikely', 'moreLikely', 'cannotTell', 'notTested']),
  words: words('The verdict as a sentence'),
}, 'Two of the anchors on one seabed')

const ends = fieldsOf({
  atTheLimit: count('To the rig\'s limit'), stoppedEarly: count('Stopped early'), crept: count('Crept'), dragged: count('Dragged'), brokeOut: count('Broke out'),
  neverSet: count('Never set'), fouled: count('Fouled'), pulls: count('All of them'),
}, 'How unmodified pulls ended, at every mass')

const holding = fieldsOf({
  holdingN: interval,
  chance: z.nullable(figure('', 'Chance that it holds at the plan\'s wind, once set; null without a plan')),
  holdingWind: z.nullable(holdingWind),
  setShare: z.nullable(share),
  resetShare: z.nullable(share),
  veer: z.nullable(share),
  pulls: count('Pulls that entered the fit'),
  days: count('Days they were made on'),
  atLimit: count('Of them at the rig\'s limit'),
  scaledFromKg: z.nullable(figure('kg', 'Mass pulled, where this one is outside 0.5 to 2 times it')),
  ends: z.nullable(ends),
}, 'One of the anchors on one seabed')

export const comparisonAnswer = fieldsOf({
  fit: fitName,
  massKg: figure('kg', 'Mass of the anchors that named none'),
  loadN: z.nullable(figure('N', 'Survey load of the plan')),
  upliftFactor: z.nullable(figure('', 'Share of holding that the plan\'s shank angle leaves')),
  anchors: list(fieldsOf({
    design: words('Slug of the design'),
    name: words('Name of the design'),
    family: z.enum(families),
    massKg: figure('kg', 'Mass'),
    size: z.nullable(size),
    worst: z.nullable(fieldsOf({ seabed: z.enum(seabeds), holdingWind }, 'The seabed of the mix with the lowest holding wind')),
    weightedChance: z.nullable(figure('', 'Sum of share times chance over the mix')),
  }, 'An anchor'), 'In the order asked for'),
  seabeds: list(fieldsOf({
    seabed: z.enum(seabeds),
    share: z.nullable(figure('', 'Share of the mix; null without a plan')),
    holdings: list(z.nullable(holding), 'In the order of the anchors; null: nothing is known of it here'),
    pairs: list(pair, 'Every two anchors'),
  }, 'A seabed'), 'Seabeds of the plan, else every seabed that any of them was pulled on'),
  summary: list(z.string(), 'One sentence a pair, over all seabeds'),
  cautions: list(z.string(), 'To stand beside every figure'),
  hidden: count('Seabeds that the asker may not read'),
}, 'Anchors compared')
