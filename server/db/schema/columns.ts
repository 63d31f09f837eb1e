import { sql } from 'drizzle-orm'
import type { AnyPgColumn } from 'drizzle-orm/pg-core'
import { check, doublePrecision, timestamp } from 'drizzle-orm/pg-core'

/** A finite physical quantity; its unit is the end of the column's name. */
export const quantity = (name: string) => doublePrecision(name)

export const moment = (name: string) => timestamp(name, { withTimezone: true, mode: 'string' })

/** CHECK that a column holds one of the words of a closed list (null passes: not null is said on the column). */
export function oneOf(name: string, column: AnyPgColumn, words: readonly string[]) {
  return check(name, sql`${column} in (${sql.raw(words.map(word => `'${word}'`).join(', '))})`)
}

/** CHECK low <= column <= high; refuses NaN and infinities as well. */
export function within(name: string, column: AnyPgColumn, low: number, high: number) {
  return check(name, sql`${column} between ${sql.raw(String(low))} and ${sql.raw(String(high))}`)
}

/** CHECK that a text is a kebab-case slug. */
export function isSlug(name: string, column: AnyPgColumn) {
  return check(name, sql`${column} ~ '^[a-z0-9]+(-[a-z0-9]+)*$'`)
}
