import { sql } from 'drizzle-orm'
import { check, index, integer, jsonb, pgTable, serial, text, unique } from 'drizzle-orm/pg-core'
import type { DescribedRows, ReleaseFile } from '../../../shared/types/release'
import { moment, oneOf } from './columns'
import { fits } from './fits'
import { pulls, trials } from './trials'

/**
 * A frozen, numbered edition of the data: the pulls published by `cutAt`, the corrections known by then, and the fit of exactly those.
 * Pulls are never changed, so their numbers freeze them; what describes them (designs, rigs, trials) may be edited later, so it is kept as it was.
 */
export const releases = pgTable('releases', {
  id: serial().primaryKey(),
  version: text().notNull(),
  cutAt: moment('cut_at').notNull(),
  madeAt: moment('made_at').notNull().defaultNow(),
  fitId: integer('fit_id').notNull().references(() => fits.id),
  /** SHA-256 over the release's files, so that a rebuilt one can be told from a changed one */
  hash: text().notNull(),
  notes: text().notNull().default(''),
  /** every pull of the release by its number, superseded ones too */
  pullIds: integer('pull_ids').array().notNull(),
  described: jsonb().$type<DescribedRows>().notNull(),
  files: jsonb().$type<ReleaseFile[]>().notNull(),
}, table => [
  unique('releases_version').on(table.version),
  check('releases_version_form', sql`${table.version} ~ '^[0-9]+([.][0-9]+)*$'`),
  check('releases_have_pulls', sql`cardinality(${table.pullIds}) > 0`),
  check('releases_hash_form', sql`${table.hash} ~ '^[0-9a-f]{64}$'`),
])

/** "Something wrong with this pull?": kept for the reviewers. */
export const pullQuestions = pgTable('pull_questions', {
  id: serial().primaryKey(),
  pullId: integer('pull_id').notNull().references(() => pulls.id),
  question: text().notNull(),
  mailAddress: text('mail_address').notNull(),
  state: text().notNull().default('open'),
  createdAt: moment('created_at').notNull().defaultNow(),
}, table => [
  index('pull_questions_pull').on(table.pullId),
  oneOf('pull_questions_state_known', table.state, ['open', 'answered', 'closed']),
  check('pull_questions_length', sql`char_length(${table.question}) between 10 and 2000`),
  check('pull_questions_mail_form', sql`char_length(${table.mailAddress}) between 3 and 254 and ${table.mailAddress} like '%_@_%' and ${table.mailAddress} !~ '[[:cntrl:][:space:]]'`),
])

/** What whoever made a design has to say to a trial of it. */
export const trialReplies = pgTable('trial_replies', {
  id: serial().primaryKey(),
  trialId: integer('trial_id').notNull().references(() => trials.id),
  author: text().notNull(),
  reply: text().notNull(),
  publishedAt: moment('published_at').notNull().defaultNow(),
}, table => [
  index('trial_replies_trial').on(table.trialId),
  check('trial_replies_length', sql`char_length(${table.reply}) between 1 and 5000`),
])
