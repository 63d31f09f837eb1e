import { unitSystems } from '#shared/units/systems'
import type { UnitSystem } from '#shared/units/systems'

/** What a reader may choose about the pages, and the one cookie value that keeps it. */

export const modes = ['system', 'day', 'night', 'sun'] as const
export type Mode = (typeof modes)[number]

export interface Preferences { mode: Mode, units: UnitSystem }

export const defaultPreferences: Preferences = { mode: 'system', units: 'asAtSea' }

const has = <T extends string>(list: readonly T[], value: unknown): value is T => (list as readonly unknown[]).includes(value)

/** One of the four modes, else null: nothing else ever reaches the page or the cookie. */
export const readMode = (value: unknown): Mode | null => has(modes, value) ? value : null

/** One of the three systems of units, else null. */
export const readUnits = (value: unknown): UnitSystem | null => has(unitSystems, value) ? value : null

/** Cookie value such as `night.imperial`. */
export const writePreferences = ({ mode, units }: Preferences): string => `${mode}.${units}`

/** Reads a cookie value; what is not one of the fixed values falls back to the default. */
export function readPreferences(value: unknown): Preferences {
  const [mode, units] = typeof value === 'string' ? value.split('.') : []
  return { mode: readMode(mode) ?? defaultPreferences.mode, units: readUnits(units) ?? defaultPreferences.units }
}
