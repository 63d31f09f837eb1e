import * as z from 'zod/mini'
import { fieldsOf } from '../fields'
import { figure, list, words } from './figures'

const table = fieldsOf({
  loadN: figure('N', 'Wind only'),
  rowFt: figure('ft', 'Row of the table'),
  decidedBy: z.enum(['length', 'beam']),
  neighbourN: z.nullable(figure('N', 'The next smaller row at the same wind; null on the first')),
}, 'Table load: a conservative envelope, from memory of ABYC H-40 table 1')

const part = fieldsOf({
  part: words('What the wind pushes on'),
  areaM2: figure('m2', 'Area'),
  dragCoefficient: figure('', 'Drag coefficient'),
  loadN: figure('N', 'Load at the speed entered'),
}, 'One part')

const survey = fieldsOf({
  steadyN: figure('N', 'At the speed entered, mean or gust as said'),
  gustN: figure('N', 'After the gust factor; equal to steadyN for a gust'),
  sheerN: figure('N', 'The gust with the boat sheering'),
  currentN: figure('N', 'Current'),
  surgeN: z.nullable(figure('N', 'Surge\'s peak above gustN; 0 without swell, null where the rode cannot bound it')),
  totalN: z.nullable(figure('N', 'max(sheerN, gustN + surgeN) + currentN; null where surgeN is')),
  parts: list(part, 'Parts that add up to steadyN'),
}, 'Survey load: the best estimate')

export const loadAnswer = fieldsOf({
  table: z.nullable(table),
  tableNote: z.optional(words('Why the table gives no load, or how it was entered')),
  survey,
  designN: z.nullable(figure('N', 'For strength: max(survey.totalN, table.loadN + survey.currentN)')),
  notes: list(z.string(), 'What was guessed, and what could not be worked out'),
}, 'What the boat asks of the anchor')
