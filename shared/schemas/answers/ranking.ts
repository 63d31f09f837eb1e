import * as z from 'zod/mini'
import { families, seabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, figure, flag, interval, list, share, words } from './figures'
import { loadAnswer } from './load'
import { rodeAnswer } from './rode'

const seabed = z.enum(seabeds)

export const holdingWind = z.union([
  fieldsOf({ meanMs: figure('m/s', 'Mean'), gustMs: figure('m/s', 'Gust'), atLeast: flag('Capped at the most any pull here showed') }, 'The wind at which the chance falls to 0.9'),
  fieldsOf({ reason: z.enum(['doesNotReach', 'beyond64kn']) }, 'No wind can be given'),
])

const rankedSeabed = fieldsOf({
  seabed,
  share: figure('', 'Share of the mix'),
  holdingN: z.nullable(interval),
  upliftFactor: figure('', 'Share of holding left at the plan\'s shank angle'),
  chance: z.nullable(figure('', 'Chance that it holds, once set')),
  setShare: z.nullable(share),
  holdingWind: z.nullable(holdingWind),
  tableWindMs: z.nullable(figure('m/s', 'Wind at which the table load meets the median holding')),
  veer: z.nullable(share),
  pulls: count('Pulls that entered the fit'),
  days: count('Days they were made on'),
  atLimit: count('Of them at the rig\'s limit'),
  scaledFromKg: z.nullable(figure('kg', 'Mass pulled, where the row\'s is outside 0.5 to 2 times it')),
}, 'One design on one seabed of the mix, at the row\'s mass')

const row = fieldsOf({
  rank: z.nullable(count('Place; null where not ranked')),
  design: words('Slug of the design'),
  name: words('Name of the design'),
  family: z.enum(families),
  tiedWithNext: flag('Its order with the next row is a coin-toss'),
  reason: words('Why it stands here'),
  worst: z.nullable(fieldsOf({ seabed, holdingWind }, 'The seabed with the lowest holding wind')),
  weightedChance: figure('', 'Sum of share times chance'),
  seabeds: list(rankedSeabed, 'Each seabed of the mix'),
  smallestServing: fieldsOf({
    survey: z.nullable(figure('kg', 'Smallest real size whose chance reaches the target on the worst seabed')),
    table: z.nullable(figure('kg', 'Smallest real size whose median holding meets the table load on every numbered seabed')),
  }, 'Smallest real sizes that serve; null: none of its sizes'),
  sizes: list(fieldsOf({ massKg: figure('kg', 'Mass'), chanceWorst: z.nullable(figure('', 'Chance on the worst seabed')) }, 'A real size'), 'Its real sizes'),
}, 'One design at the mass of all rows')

const ruleTable = fieldsOf({
  table: words('Which table'),
  source: words('Where it is from'),
  meanLengthM: figure('m', 'Length it was entered with'),
  rowM: z.nullable(figure('m', 'Row')),
  anchorKg: z.nullable(figure('kg', 'Main anchor')),
  chainMm: z.nullable(figure('mm', 'Chain')),
  note: z.optional(words('Note')),
}, 'What a rule table says')

export const fitName = fieldsOf({ id: count('Number of the fit'), modelVersion: words('Version of the model'), at: words('When it was made, UTC') }, 'The fit that the answer rests on')

export const rankingAnswer = fieldsOf({
  load: loadAnswer,
  rode: z.nullable(rodeAnswer),
  massKg: z.nullable(figure('kg', 'Mass of all rows')),
  fit: fitName,
  cautions: list(z.string(), 'To stand beside every figure'),
  ruleTables: list(ruleTable, 'Rule tables beside it'),
  rows: list(row, 'Designs in order; empty where the load is null'),
  thin: list(row, 'Designs with too little evidence to rank'),
  own: z.nullable(fieldsOf({ row, verdict: z.enum(['holds', 'marginal', 'doesNotHold', 'notTested']) }, 'The sailor\'s own anchor at its own mass')),
  hidden: count('Rows that the asker may not read'),
}, 'Designs in order for a plan, each with its reasons')
