import * as z from 'zod/mini'
import { numberedSeabeds } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { count, figure, flag, list, words } from './figures'

const named = fieldsOf({ slug: words('Slug'), name: words('Name') }, 'What it is')

const holding = fieldsOf({
  median: figure('N', 'Median at 15 kg, flat pull'),
  low90: figure('N', 'Lower end of the 90 % interval'),
  high90: figure('N', 'Upper end of the 90 % interval'),
  pulls: count('Pulls behind it; 0: from its family'),
}, 'An estimate')

const move = fieldsOf({
  design: words('Slug of the design'), name: words('Name of the design'), seabed: z.enum(numberedSeabeds),
  before: holding, after: holding, ratio: figure('', 'Median after over before'),
}, 'How one estimate moved')

const changes = fieldsOf({
  since: z.nullable(words('The release before; null for the first')),
  pulls: count('Pulls that came in'),
  corrections: count('Pulls that a correction took the place of'),
  trials: list(z.string(), 'Trials that came in, by slug'),
  designs: list(named, 'Designs that came in'),
  modifications: list(named, 'Modifications that came in'),
  seabeds: list(z.enum(numberedSeabeds), 'Seabeds that came in'),
  compared: count('Estimates that both releases give'),
  added: count('Estimates that only this one gives'),
  movedMuch: count('Of those compared, medians that moved by more than 15 % either way'),
  outside: count('Of those compared, medians outside the earlier 90 % interval'),
  widthRatio: z.nullable(figure('', 'Middle of the ratios of interval widths, after over before, in ln load')),
  largest: list(move, 'Those that moved furthest, furthest first'),
}, 'What changed since the release before')

const file = fieldsOf({
  name: words('Name: /api/releases/{version}/{name}'),
  title: words('What is in it'),
  rows: z.nullable(count('Rows; null for what is no table')),
  bytes: count('Size in bytes'),
  sha256: words('SHA-256 of the file'),
}, 'A file')

export const releaseAnswer = fieldsOf({
  version: words('Number of the release'),
  cutAt: words('Pulls published and corrections known by then, UTC'),
  madeAt: words('When it was made, UTC'),
  openFrom: words('Open to everybody from then on, UTC'),
  open: flag('Open now'),
  licence: fieldsOf({ name: words('SPDX name'), title: words('Title'), url: words('Text') }, 'Licence of the data, once open'),
  citation: words('How to cite it'),
  invented: flag('Demonstration data: invented'),
  notes: words('Notes'),
  hash: words('SHA-256 of datapackage.json, which holds the hash of every table'),
  fit: fieldsOf({ modelVersion: words('Version of the model'), dataHash: words('Hash of the pulls in canonical order') }, 'The fit of exactly these pulls'),
  pulls: count('Pulls that stand'),
  files: list(file, 'Files'),
  changes,
}, 'A frozen, numbered edition of the data')

export const releasesAnswer = fieldsOf({ releases: list(releaseAnswer, 'Releases, newest first') }, 'The releases')
