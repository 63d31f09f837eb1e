import { pgTable, text } from 'drizzle-orm/pg-core'

/** Small facts about this database, such as which demo world it holds. */
export const facts = pgTable('facts', {
  name: text().primaryKey(),
  value: text().notNull(),
})
