import * as z from 'zod/mini'
import { attitudes, conditions, families, foulings, numberedSeabeds, pullAfters, pullEnds, settingOutcomes, veerOutcomes } from '#shared/types/words'
import { fieldsOf } from '../fields'
import { designListing, seabedListing } from './catalogue'
import { count, figure, flag, interval, list, share, words } from './figures'
import { fitName } from './ranking'

const seabed = z.enum(numberedSeabeds)
const kg = figure('kg', 'Anchor mass')
export const paged = { total: count('Entries in all'), page: count('This page, from 1'), pages: count('Pages of fifty') }

export const designsAnswer = fieldsOf({
  designs: list(z.extend(designListing, {
    pulls: count('Unmodified pulls that entered the newest fit'),
    tested: list(fieldsOf({ seabed, pulls: count('Pulls there') }, 'A seabed it was pulled on'), 'Where it was pulled'),
  }), 'Fifty at most'),
  ...paged,
}, 'A page of the designs')

export const designNamesAnswer = fieldsOf({
  designs: list(fieldsOf({ slug: words('Slug'), name: words('Name') }, 'A design'), 'By name'),
}, 'Every design\'s name')

const ticks = list(fieldsOf({ loadN: figure('N', 'Load, scaled to the mass and to a flat pull'), atLimit: flag('At the rig\'s limit') }, 'A pull'), 'Single pulls, newest first')

const evidence = {
  pulls: count('Pulls; 0: from the family, wider'),
  days: count('Days they were made on'),
  atLimit: count('Of them at the rig\'s limit'),
  scaledFromKg: z.nullable(figure('kg', 'Scaled from this mass')),
  setShare: z.nullable(share),
  resetShare: z.nullable(share),
  veerShare: z.nullable(share),
}

const counts = <T extends z.core.SomeType>(word: T, description: string) => list(fieldsOf({ word, count: count('How often') }, 'A word'), description)

export const designAnswer = fieldsOf({
  design: designListing,
  massKg: kg,
  fit: z.nullable(fitName),
  seabeds: list(fieldsOf({ seabed, holdingN: z.nullable(interval), ...evidence, ticks }, 'On one seabed'), 'Every seabed of the fit'),
  manner: fieldsOf({
    pulls: count('Published unmodified pulls'),
    setting: counts(z.enum(settingOutcomes), 'How it set'),
    end: counts(z.enum(pullEnds), 'How the pull ended'),
    after: counts(z.enum(pullAfters), 'After a breakout'),
    veer: counts(z.enum(veerOutcomes), 'When the load was turned'),
    attitude: counts(z.enum(attitudes), 'How it lay'),
    fouling: counts(z.enum(foulings), 'What it brought up'),
    condition: counts(z.enum(conditions), 'What it looked like after'),
  }, 'How its pulls went'),
  modifications: list(fieldsOf({
    design: words('Slug'), modification: words('Slug'), name: words('Name'), seabed,
    lnRatio: figure('', 'ln of modified over unmodified holding'), lnSd: figure('', 'Its standard deviation'),
    pulls: count('Pulls'), pairs: count('Back-to-back pairs'),
    verdict: z.nullable(z.enum(['better', 'worse', 'noDifference', 'cannotTell'])),
  }, 'A modification on a seabed'), 'Its modifications'),
  trials: list(fieldsOf({ slug: words('Slug'), day: words('Day'), place: words('Place'), pulls: count('Pulls of it') }, 'A trial'), 'The newest trials with it'),
}, 'A design')

const seabedRow = fieldsOf({
  rank: z.nullable(count('Place; null: too little evidence')),
  design: words('Slug'), name: words('Name'), family: z.enum(families),
  holdingN: interval, ...evidence,
  tiedWithNext: flag('Cannot be told apart from the next'),
  ticks,
}, 'A design here')

export const seabedAnswer = fieldsOf({
  seabed: seabedListing,
  massKg: kg,
  fit: z.nullable(fitName),
  rows: list(seabedRow, 'Highest median first, fifty at most'),
  thin: list(seabedRow, 'Too little evidence to rank, fifty at most'),
  ranked: count('Designs ranked in all'),
  thinCount: count('Designs with too little evidence in all'),
  neverPulled: count('Designs never pulled here'),
}, 'A seabed and the designs on it')

export const trialsAnswer = fieldsOf({
  trials: list(fieldsOf({
    slug: words('Slug'), day: words('Day'), place: words('Place'), tester: words('Tester'), rig: words('Rig'),
    seabeds: list(seabed, 'Seabeds pulled on'), designs: count('Designs'), pulls: count('Pulls'), invented: flag('Of the demo world'),
  }, 'A trial'), 'Newest first, fifty at most'),
  ...paged,
}, 'A page of the trials')

const nullable = (unit: string, description: string) => z.nullable(figure(unit, description))

const trial = fieldsOf({
  slug: words('Slug'), day: words('Day'), place: words('Place'), tester: words('Tester'),
  latitudeDeg: nullable('deg', 'Latitude, rounded'), longitudeDeg: nullable('deg', 'Longitude, rounded'),
  depthM: figure('m', 'Depth'), windMs: nullable('m/s', 'Wind'), windFrom: words('Where it came from'),
  currentMs: nullable('m/s', 'Current'), waveHeightM: nullable('m', 'Wave height'), seaState: words('Sea'),
  procedure: words('Procedure'), note: words('Note'),
  rode: fieldsOf({
    chainLengthM: figure('m', 'Chain'), chainDiameterMm: figure('mm', 'Chain size'),
    ropeLengthM: z.optional(figure('m', 'Rope')), ropeDiameterMm: z.optional(figure('mm', 'Rope size')), bowHeightM: figure('m', 'Bow height'),
  }, 'Rode'),
  invented: flag('Of the demo world'),
  rig: fieldsOf({
    name: words('Name'), vessel: words('Vessel'), method: words('How it pulls and measures'), limitN: figure('N', 'Its limit'),
    stepsN: list(z.number(), 'Its steps (N)'), holdS: figure('s', 'Hold time'), calibratedOn: z.nullable(words('Day of calibration')),
    calibrationMethod: words('How'), calibrationSd: nullable('ln load', 'Its error'),
  }, 'Rig'),
}, 'A trial')

export const trialAnswer = fieldsOf({
  trial,
  fit: z.nullable(fitName),
  comparisons: list(fieldsOf({
    design: words('Slug'), name: words('Name'), massKg: kg, seabed, pulls: count('Pulls in the mean'), meanN: figure('N', 'Plain mean of what was held, failures as 0'),
    atLeast: flag('A pull ended at the rig\'s limit'), estimateN: z.nullable(interval), reason: words('Why they differ'),
  }, 'One anchor on one seabed'), 'Plain means beside estimates'),
  replies: list(fieldsOf({ author: words('Who'), reply: words('What'), publishedAt: words('When, UTC') }, 'A reply'), 'By who made a design'),
}, 'A trial')

export const trialPullsAnswer = fieldsOf({
  pulls: list(fieldsOf({
    id: count('Number'), ordinal: count('Place in the trial'), design: words('Slug'), name: words('Name'), massKg: kg,
    anchorSetting: z.nullable(words('Fluke setting')),
    modification: z.nullable(fieldsOf({ slug: words('Slug'), name: words('Name') }, 'Modification')),
    pair: z.nullable(words('The same on both pulls of a back-to-back pair')), seabed,
    setting: z.enum(settingOutcomes), firstTry: flag('At the first try'), fresh: flag('Not after a breakout'),
    heldN: figure('N', 'Held'), movedN: nullable('N', 'Moved; null: the limit, or stopped early'), shankAngleDeg: figure('deg', 'Shank angle'),
    end: z.nullable(z.enum(pullEnds)), creepMMin: nullable('m/min', 'Creep'), after: z.nullable(z.enum(pullAfters)),
    veerDeg: nullable('deg', 'Turned by'), veer: z.nullable(z.enum(veerOutcomes)),
    attitude: z.enum(attitudes), fouling: z.enum(foulings), condition: z.enum(conditions), note: words('Note'),
    supersededBy: z.nullable(count('The pull that stands in its place')),
  }, 'A pull'), 'In the order they were made'),
}, 'The pulls of a trial')

export const questionAnswer = fieldsOf({ id: count('Number of the question'), pullId: count('Number of the pull'), createdAt: words('When, UTC') }, 'Kept for the reviewers')
