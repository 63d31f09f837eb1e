import * as z from 'zod/mini'
import { families, numberedSeabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, figure, flag, list, words } from './figures'

const sd = (of: string) => figure('ln load', `Standard deviation of ${of}`)

const plainMean = fieldsOf({
  massKg: figure('kg', 'Mass'),
  meanN: figure('N', 'Plain mean of what was held, failures included as 0'),
  atLeast: flag('One of the pulls reached the limit'),
  pulls: count('Pulls'),
}, 'The tester\'s rating, common practice')

const estimate = fieldsOf({
  design: words('Design'),
  family: z.enum(families),
  seabed: z.enum(numberedSeabeds),
  modification: z.nullable(z.string()),
  lnMean15Kg: z.nullable(figure('', 'ln of holding in N at 15 kg, flat pull, perfect rig')),
  lnSd: z.nullable(figure('', 'Its standard deviation')),
  pulls: count('Pulls that entered the fit'),
  days: count('Days they were made on'),
  atLimit: count('Of them at the rig\'s limit'),
  plainMeans: list(plainMean, 'By mass'),
  why: z.optional(words('Why there is no mean')),
}, 'One design, perhaps modified, on one seabed')

export const fitAnswer = fieldsOf({
  estimates: list(estimate, 'Estimates'),
  sigma: z.nullable(figure('ln load', 'Spread between single pulls; null where nothing identifies it')),
  sds: fieldsOf({
    family: sd('families'), design: sd('designs'), designSeabed: sd('designs on a seabed'), modification: sd('modifications'),
    modificationSeabed: sd('modifications on a seabed'), trial: sd('trials'), anchorDay: sd('an anchor\'s day'),
  }, 'Spread of the model\'s random terms'),
  modelVersion: words('Version of the model'),
  dataHash: words('Hash of the pulls in canonical order'),
}, 'What these pulls say')
