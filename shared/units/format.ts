import { FT_M, IN_M } from '#shared/units/constants'
import { displayUnit } from '#shared/units/systems'
import type { ForceUnit, QuantityKind, UnitSystem } from '#shared/units/systems'

/** How to print: exactly so many decimals (0 to 6) instead of at most the unit's own; a force in this unit. */
export interface FormatOptions { decimals?: number, forceUnit?: ForceUnit }

const MAX_DECIMALS = 6

/** Number formats are dear to build and cheap to keep: one for each count of decimals, at most so many, and exactly so many. */
const atMost = Array.from({ length: MAX_DECIMALS + 1 }, (_, decimals) => new Intl.NumberFormat('en-GB', { maximumFractionDigits: decimals }))
const exactly = Array.from({ length: MAX_DECIMALS + 1 }, (_, decimals) =>
  new Intl.NumberFormat('en-GB', { minimumFractionDigits: decimals, maximumFractionDigits: decimals }))

function print(value: number, decimals: number, fixed: boolean): string {
  if (!Number.isFinite(value)) throw new RangeError(`value must be between -1e300 and 1e300, got ${String(value)}`)
  const format = (fixed ? exactly : atMost)[decimals]
  if (!format) throw new RangeError(`decimals must be a whole number between 0 and ${MAX_DECIMALS}, got ${decimals}`)
  const text = format.format(value)
  return /^-[0.,]*$/.test(text) ? text.slice(1) : text
}

/**
 * The number alone, in the system's unit: for table cells whose header carries the unit.
 *
 * @param value SI value: m, kg, m/s, N, m2, m for a diameter, rad, part of one
 * @throws RangeError for a value that is not finite, or decimals outside 0 to 6
 */
export function formatNumber(value: number, kind: QuantityKind, system: UnitSystem, options: FormatOptions = {}): string {
  const unit = displayUnit(kind, system, options.forceUnit)
  return print(value / unit.factor, options.decimals ?? unit.decimals, options.decimals !== undefined)
}

/** Label of the unit that a kind of quantity is shown in. */
export function unitLabel(kind: QuantityKind, system: UnitSystem, forceUnit?: ForceUnit): string {
  return displayUnit(kind, system, forceUnit).label
}

/**
 * Number and unit, such as `11.2 m`, `5.34 kN`, `30 kn`, `8°`.
 *
 * @param value SI value: m, kg, m/s, N, m2, m for a diameter, rad, part of one
 * @throws RangeError for a value that is not finite, or decimals outside 0 to 6
 */
export function formatQuantity(value: number, kind: QuantityKind, system: UnitSystem, options: FormatOptions = {}): string {
  const label = unitLabel(kind, system, options.forceUnit)
  const number = formatNumber(value, kind, system, options)
  return kind === 'angle' ? `${number}${label}` : `${number} ${label}`
}

/** A plain number with thousands apart, at most so many decimals (0 to 6). */
export function formatPlain(value: number, decimals = 0): string {
  return print(value, decimals, false)
}

/**
 * A length in feet and whole inches, such as `35' 2"`.
 *
 * @param lengthM m, 0 to 1e6
 * @throws RangeError outside that range
 */
export function formatFeetInches(lengthM: number): string {
  if (!(lengthM >= 0 && lengthM <= 1e6)) throw new RangeError(`lengthM must be between 0 and 1e6, got ${String(lengthM)}`)
  const inches = Math.round(lengthM / IN_M)
  const perFoot = Math.round(FT_M / IN_M)
  const rest = inches % perFoot
  return rest === 0 ? `${Math.floor(inches / perFoot)}'` : `${Math.floor(inches / perFoot)}' ${rest}"`
}

/**
 * A diameter in sixteenths of an inch where it is one to 0.05 mm, such as `5/16"` or `1 1/4"`; otherwise in decimals, such as `0.394"`.
 *
 * @param diameterM m, 0 to 10
 * @throws RangeError outside that range
 */
export function formatInches(diameterM: number): string {
  if (!(diameterM >= 0 && diameterM <= 10)) throw new RangeError(`diameterM must be between 0 and 10, got ${String(diameterM)}`)
  const sixteenths = Math.round(diameterM / IN_M * 16)
  if (sixteenths === 0 || Math.abs(sixteenths / 16 * IN_M - diameterM) > 5e-5) return `${print(diameterM / IN_M, 3, false)}"`
  let [top, bottom] = [sixteenths % 16, 16]
  while (top > 0 && top % 2 === 0) [top, bottom] = [top / 2, bottom / 2]
  const whole = Math.floor(sixteenths / 16)
  if (top === 0) return `${whole}"`
  return whole === 0 ? `${top}/${bottom}"` : `${whole} ${top}/${bottom}"`
}
