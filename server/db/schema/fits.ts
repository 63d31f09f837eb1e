import { sql } from 'drizzle-orm'
import { check, doublePrecision, index, integer, jsonb, pgTable, primaryKey, serial, text, unique, uniqueIndex } from 'drizzle-orm/pg-core'
import type { HoldingSds, Share } from '../../../shared/types/holding'
import { numberedSeabeds } from '../../../shared/types/words'
import { designs, modifications } from './catalogue'
import { moment, oneOf, quantity, within } from './columns'

/** One run of the model. The same data under the same model give the same fit, so the pair is unique. */
export const fits = pgTable('fits', {
  id: serial().primaryKey(),
  modelVersion: text('model_version').notNull(),
  dataHash: text('data_hash').notNull(),
  seed: integer(),
  sigma: doublePrecision().notNull(),
  sds: jsonb().$type<HoldingSds>().notNull(),
  createdAt: moment('created_at').notNull().defaultNow(),
  /** since when readers are answered from it; null: made for a release only, or not yet */
  standsFrom: moment('stands_from'),
}, table => [
  unique('fits_model_data').on(table.modelVersion, table.dataHash),
  within('fits_sigma_range', table.sigma, 0, 100),
])

/** Holding of a design on a seabed (or the ratio of a modification there), ln N at 15 kg, flat pull, perfect rig. */
export const estimates = pgTable('estimates', {
  id: serial().primaryKey(),
  fitId: integer('fit_id').notNull().references(() => fits.id, { onDelete: 'cascade' }),
  designId: integer('design_id').notNull().references(() => designs.id),
  seabed: text().notNull(),
  modificationId: integer('modification_id').references(() => modifications.id),
  lnMean: doublePrecision('ln_mean').notNull(),
  lnSd: doublePrecision('ln_sd').notNull(),
  pulls: integer().notNull(),
  days: integer(),
  pairs: integer(),
  atLimit: integer('at_limit'),
  leastMassKg: quantity('least_mass_kg'),
  greatestMassKg: quantity('greatest_mass_kg'),
  mostShown15KgN: quantity('most_shown_15kg_n'),
  setShare: jsonb('set_share').$type<Share>(),
  resetShare: jsonb('reset_share').$type<Share>(),
  veerShare: jsonb('veer_share').$type<Share>(),
  verdict: text(),
}, table => [
  uniqueIndex('estimates_one_each').on(table.fitId, table.designId, table.seabed, sql`coalesce(${table.modificationId}, 0)`),
  index('estimates_fit_seabed').on(table.fitId, table.seabed),
  index('estimates_fit_modification').on(table.fitId, table.modificationId).where(sql`modification_id is not null`),
  oneOf('estimates_seabed_numbered', table.seabed, numberedSeabeds),
  oneOf('estimates_verdict_known', table.verdict, ['better', 'worse', 'noDifference', 'cannotTell']),
  within('estimates_sd_range', table.lnSd, 0, 100),
  within('estimates_mean_range', table.lnMean, -100, 100),
])

/** Joint covariance of the designs on one seabed, row-major in the order of design_ids, with beta_s last. */
export const covariances = pgTable('covariances', {
  fitId: integer('fit_id').notNull().references(() => fits.id, { onDelete: 'cascade' }),
  seabed: text().notNull(),
  exponent: doublePrecision().notNull(),
  betaMean: doublePrecision('beta_mean').notNull(),
  designIds: integer('design_ids').array().notNull(),
  values: doublePrecision('covariance').array().notNull(),
}, table => [
  primaryKey({ columns: [table.fitId, table.seabed] }),
  oneOf('covariances_seabed_numbered', table.seabed, numberedSeabeds),
  check('covariances_square', sql`cardinality(${table.values}) = (cardinality(${table.designIds}) + 1) * (cardinality(${table.designIds}) + 1)`),
])
