import { KN_MS } from '#shared/units/constants'

/** Winds that a plan may start from: lunch stop, working and storm, the columns of the table load. */
export const windPresets = [
  { name: 'lunch stop', knots: 15, speedMs: 15 * KN_MS },
  { name: 'working', knots: 30, speedMs: 30 * KN_MS },
  { name: 'storm', knots: 42, speedMs: 42 * KN_MS },
] as const
