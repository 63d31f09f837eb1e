import * as z from 'zod/mini'
import { numberedSeabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, figure, list } from './figures'
import { fitName } from './ranking'

const serving = fieldsOf({
  massKg: z.nullable(figure('kg', 'Smallest real size that serves; null where none does')),
  designs: count('Designs of which some size serves'),
}, 'What serves by one of the two loads')

const boat = fieldsOf({
  lengthM: figure('m', 'Length overall'),
  beamM: figure('m', 'Beam'),
  surveyN: figure('N', 'Survey load'),
  tableN: z.nullable(figure('N', 'Table load')),
  ruleTableKg: z.nullable(figure('kg', 'Main anchor by the rule table')),
  seabeds: list(fieldsOf({ seabed: z.enum(numberedSeabeds), ranked: count('Designs ranked'), survey: serving, table: serving }, 'A seabed'), 'Seabeds that were pulled on'),
}, 'A reference boat in 30 kn of gusts')

export const referenceBoatsAnswer = fieldsOf({ fit: fitName, boats: list(boat, 'Boats') }, 'Three reference boats, what the wind asks and what serves')
