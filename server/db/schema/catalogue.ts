import { sql } from 'drizzle-orm'
import { boolean, char, check, date, integer, pgTable, serial, text, unique } from 'drizzle-orm/pg-core'
import { families as familySlugs, seabeds as seabedSlugs, soilKinds } from '../../../shared/types/words'
import { isSlug, oneOf, quantity, within } from './columns'

export const seabeds = pgTable('seabeds', {
  slug: text().primaryKey(),
  name: text().notNull(),
  soil: text().notNull(),
  numbered: boolean().notNull(),
}, table => [
  oneOf('seabeds_slug_known', table.slug, seabedSlugs),
  oneOf('seabeds_soil_known', table.soil, soilKinds),
  check('seabeds_numbered_has_soil', sql`${table.numbered} = (${table.soil} <> 'none')`),
])

export const families = pgTable('families', {
  slug: text().primaryKey(),
  name: text().notNull(),
}, table => [oneOf('families_slug_known', table.slug, familySlugs)])

export const designs = pgTable('designs', {
  id: serial().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  family: text().notNull().references(() => families.slug),
  description: text().notNull().default(''),
  /** fluke settings that its maker provides; empty: none */
  settings: text().array().notNull().default([]),
  /** true for the demo world's designs: the pages say so */
  invented: boolean().notNull().default(false),
}, table => [isSlug('designs_slug_form', table.slug)])

/** A mass of a design, with what a chandlery states about it; null is "not stated". */
export const sizes = pgTable('sizes', {
  id: serial().primaryKey(),
  designId: integer('design_id').notNull().references(() => designs.id, { onDelete: 'cascade' }),
  massKg: quantity('mass_kg').notNull(),
  shankLengthMm: quantity('shank_length_mm'),
  flukeWidthMm: quantity('fluke_width_mm'),
  overallHeightMm: quantity('overall_height_mm'),
  shackleHoleMm: quantity('shackle_hole_mm'),
  material: text(),
  shankStrengthN: quantity('shank_strength_n'),
  finish: text(),
  stowsFlat: boolean('stows_flat'),
  priceMinor: integer('price_minor'),
  priceCurrency: char('price_currency', { length: 3 }),
  priceOn: date('price_on', { mode: 'string' }),
}, table => [
  unique('sizes_design_mass').on(table.designId, table.massKg),
  unique('sizes_id_design').on(table.id, table.designId),
  within('sizes_mass_range', table.massKg, 0.5, 2000),
  within('sizes_shank_length_range', table.shankLengthMm, 50, 5000),
  within('sizes_fluke_width_range', table.flukeWidthMm, 20, 5000),
  within('sizes_overall_height_range', table.overallHeightMm, 20, 5000),
  within('sizes_shackle_hole_range', table.shackleHoleMm, 3, 100),
  within('sizes_shank_strength_range', table.shankStrengthN, 100, 5_000_000),
  check('sizes_price_whole', sql`(${table.priceMinor} is null) = (${table.priceCurrency} is null) and (${table.priceMinor} is null) = (${table.priceOn} is null)`),
  check('sizes_price_range', sql`${table.priceMinor} >= 0`),
])

export const modifications = pgTable('modifications', {
  id: serial().primaryKey(),
  slug: text().notNull().unique(),
  name: text().notNull(),
  description: text().notNull().default(''),
  /** what the change adds to an anchor of 20 kg, and what it costs, where known; null is "not stated" */
  addedMassKg: quantity('added_mass_kg'),
  priceMinor: integer('price_minor'),
  priceCurrency: char('price_currency', { length: 3 }),
  priceOn: date('price_on', { mode: 'string' }),
}, table => [
  isSlug('modifications_slug_form', table.slug),
  within('modifications_added_mass_range', table.addedMassKg, -500, 500),
  check('modifications_price_whole', sql`(${table.priceMinor} is null) = (${table.priceCurrency} is null) and (${table.priceMinor} is null) = (${table.priceOn} is null)`),
])
