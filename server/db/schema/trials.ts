import { sql } from 'drizzle-orm'
import type { AnyPgColumn } from 'drizzle-orm/pg-core'
import { boolean, check, date, doublePrecision, foreignKey, index, integer, jsonb, pgTable, serial, text, unique } from 'drizzle-orm/pg-core'
import {
  attitudes, conditions, foulings, numberedSeabeds, pullAfters, pullEnds, settingOutcomes, veerOutcomes,
} from '../../../shared/types/words'
import { designs, modifications, sizes } from './catalogue'
import { isSlug, moment, oneOf, quantity, within } from './columns'

/** How a tester pulls and measures. */
export const rigs = pgTable('rigs', {
  id: serial().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  vessel: text().notNull().default(''),
  method: text().notNull().default(''),
  limitN: quantity('limit_n').notNull(),
  stepsN: doublePrecision('steps_n').array().notNull(),
  holdS: quantity('hold_s').notNull().default(30),
  calibratedOn: date('calibrated_on', { mode: 'string' }),
  calibrationMethod: text('calibration_method').notNull().default(''),
  /** sd of the calibration error in ln load; null: not stated, the model's default */
  calibrationSd: doublePrecision('calibration_sd'),
  invented: boolean().notNull().default(false),
}, table => [
  isSlug('rigs_slug_form', table.slug),
  within('rigs_limit_range', table.limitN, 10, 1_000_000),
  within('rigs_hold_range', table.holdS, 1, 3600),
  within('rigs_calibration_sd_range', table.calibrationSd, 0, 1),
])

/** The rode used on a day of pulls. */
export interface TrialRode { chainLengthM: number, chainDiameterMm: number, ropeLengthM?: number, ropeDiameterMm?: number, bowHeightM: number }

/** A day of pulls by one tester at one place. */
export const trials = pgTable('trials', {
  id: serial().primaryKey(),
  slug: text().notNull().unique(),
  rigId: integer('rig_id').notNull().references(() => rigs.id),
  tester: text().notNull(),
  day: date({ mode: 'string' }).notNull(),
  place: text().notNull(),
  latitudeDeg: doublePrecision('latitude_deg'),
  longitudeDeg: doublePrecision('longitude_deg'),
  depthM: quantity('depth_m').notNull(),
  windMs: quantity('wind_ms'),
  currentMs: quantity('current_ms'),
  windFrom: text('wind_from').notNull().default(''),
  waveHeightM: quantity('wave_height_m'),
  seaState: text('sea_state').notNull().default(''),
  procedure: text().notNull().default(''),
  note: text().notNull().default(''),
  rode: jsonb().$type<TrialRode>().notNull(),
  publishedAt: moment('published_at'),
  invented: boolean().notNull().default(false),
}, table => [
  isSlug('trials_slug_form', table.slug),
  within('trials_latitude_range', table.latitudeDeg, -90, 90),
  within('trials_longitude_range', table.longitudeDeg, -180, 180),
  within('trials_depth_range', table.depthM, 0.5, 100),
  within('trials_wind_range', table.windMs, 0, 60),
  within('trials_current_range', table.currentMs, 0, 5),
  index('trials_published').on(table.publishedAt),
  index('trials_rig').on(table.rigId),
  within('trials_wave_range', table.waveHeightM, 0, 20),
])

/** One anchor set and loaded in steps. Never changed once published: a correction supersedes it. */
export const pulls = pgTable('pulls', {
  id: serial().primaryKey(),
  trialId: integer('trial_id').notNull().references(() => trials.id),
  ordinal: integer().notNull(),
  designId: integer('design_id').notNull().references(() => designs.id),
  sizeId: integer('size_id').notNull(),
  modificationId: integer('modification_id').references(() => modifications.id),
  anchorSetting: text('anchor_setting'),
  /** the same text on both pulls of a back-to-back pair */
  pair: text(),
  seabed: text().notNull(),
  setting: text().notNull(),
  firstTry: boolean('first_try').notNull(),
  fresh: boolean().notNull().default(true),
  heldN: quantity('held_n').notNull(),
  movedN: quantity('moved_n'),
  shankAngleDeg: quantity('shank_angle_deg').notNull().default(0),
  end: text('ended'),
  creepMMin: quantity('creep_m_min'),
  after: text(),
  veerDeg: quantity('veer_deg'),
  veer: text(),
  /** from the trial's rounded position, m */
  eastM: quantity('east_m'),
  northM: quantity('north_m'),
  attitude: text().notNull().default('notSeen'),
  fouling: text().notNull().default('clean'),
  condition: text().notNull().default('undamaged'),
  note: text().notNull().default(''),
  supersededById: integer('superseded_by_id').references((): AnyPgColumn => pulls.id),
  /** when the row was written down: a correction is known from then on; before its trial is published nobody sees it */
  recordedAt: moment('recorded_at').notNull().defaultNow(),
}, table => [
  unique('pulls_trial_ordinal').on(table.trialId, table.ordinal),
  // The mass comes from the size and the name from the design: they must be of one anchor.
  foreignKey({ name: 'pulls_size_of_design', columns: [table.sizeId, table.designId], foreignColumns: [sizes.id, sizes.designId] }),
  index('pulls_design_seabed').on(table.designId, table.seabed),
  index('pulls_seabed').on(table.seabed),
  index('pulls_modification').on(table.modificationId).where(sql`modification_id is not null`),
  index('pulls_pair').on(table.trialId, table.pair).where(sql`pair is not null`),
  oneOf('pulls_seabed_numbered', table.seabed, numberedSeabeds),
  oneOf('pulls_setting_known', table.setting, settingOutcomes),
  oneOf('pulls_end_known', table.end, pullEnds),
  oneOf('pulls_after_known', table.after, pullAfters),
  oneOf('pulls_veer_known', table.veer, veerOutcomes),
  oneOf('pulls_attitude_known', table.attitude, attitudes),
  oneOf('pulls_fouling_known', table.fouling, foulings),
  oneOf('pulls_condition_known', table.condition, conditions),
  within('pulls_held_range', table.heldN, 0, 1_000_000),
  within('pulls_moved_range', table.movedN, 1, 1_000_000),
  within('pulls_angle_range', table.shankAngleDeg, 0, 60),
  within('pulls_creep_range', table.creepMMin, 0, 100),
  within('pulls_veer_deg_range', table.veerDeg, 0, 180),
  check('pulls_moved_above_held', sql`${table.movedN} > ${table.heldN}`),
  check('pulls_never_set_held_nothing', sql`${table.setting} not in ('neverSet', 'fouled') or ${table.heldN} = 0`),
  check('pulls_set_has_bracket', sql`${table.setting} in ('neverSet', 'fouled') or ${table.heldN} > 0 or ${table.movedN} is not null`),
  check('pulls_veer_whole', sql`(${table.veerDeg} is null) = (${table.veer} is null)`),
])
