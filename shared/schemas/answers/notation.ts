import * as z from 'zod/mini'
import { seabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, list, words } from './figures'

const constituent = fieldsOf({
  noun: words('In words'),
  natsur: z.nullable(count('Code of the nature of surface, S-57 NATSUR')),
  qualifiers: list(z.string(), 'In words'),
  natqua: list(z.int(), 'Codes of the qualifying terms, S-57 NATQUA'),
}, 'One constituent')

export const notationAnswer = fieldsOf({
  layers: list(list(constituent, 'Constituents, main one first'), 'Layers, top first'),
  seabed: z.nullable(z.enum(seabeds)),
  alternatives: list(z.enum(seabeds), 'Other seabeds it could be'),
  cautions: list(z.string(), 'Cautions'),
  unread: list(fieldsOf({ text: words('What could not be read'), at: count('Where it stands, from 0') }, 'An unread part'), 'Parts that could not be read'),
}, 'A seabed in chart notation, read')
