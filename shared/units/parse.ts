import { beaufortSpeedMs } from '#shared/units/beaufort'
import { FT_M, IN_M, KN_MS } from '#shared/units/constants'
import { formatInches, formatPlain } from '#shared/units/format'
import { tidy } from '#shared/units/tidy'
import { readNumber } from '#shared/units/number'
import { displayUnit } from '#shared/units/systems'
import type { QuantityKind, UnitSystem } from '#shared/units/systems'
import { examples, typedUnit } from '#shared/units/typedUnits'

/** What was read: SI value (m, kg, m/s, N, m2, m for a diameter, rad, part of one), and what was understood in words. */
export interface Understood {
  value: number
  understood: string
  /** the Beaufort force typed: a 10-minute mean at 10 m */
  beaufort?: number
  /** a diameter typed in inches that is a whole number of sixteenths, such as `5/16` or `1 1/4`: the key of inch lists */
  sizeIn?: string
}

/** What was not read, in a sentence that says what is. */
export interface NotUnderstood { error: string }

/** Default unit by system (metric), and the allowed interval in SI; least 0 unless said otherwise. */
export interface ParseOptions { system?: UnitSystem, min?: number, max?: number }

const LONGEST = 60
/** Nothing typed here is larger, in SI. */
const LARGEST = 1e12

/**
 * Reads a quantity as people type it: `35ft`, `35' 2 1/2"`, `11,2 m`, `1,200 kg`, `4.5 t`, `F8`, `30 kn`, `5/16"`.
 * Without a unit the system's own is taken; a bare fraction is inches for a diameter. A bare share up to 1 is a part of one, above it per cent.
 * Marks between digits are read as `decimalValue` says. Beaufort gives the upper end of its band. A force in kg, t or lb is that mass's weight.
 *
 * @param text anything at all
 * @param kind the quantity wanted
 * @param options the system that a bare number is read in, and the allowed interval in SI
 * @returns the finite SI value with what was understood, or an error that says what is accepted; it never throws on any text
 */
export function parseQuantity(text: string, kind: QuantityKind, options: ParseOptions = {}): Understood | NotUnderstood {
  const tidied = text.length > LONGEST ? '' : tidy(text)
  if (tidied === '') return { error: `Type ${accepted(kind, options)}.` }
  const read = (kind === 'speed' ? readBeaufort(tidied) : null)
    ?? (kind === 'length' || kind === 'diameter' ? readFeetInches(tidied) : null)
    ?? readPlain(tidied, kind, options.system ?? 'metric')
  if ('error' in read) return { error: `${read.error} Type ${accepted(kind, options)}.` }
  const limits = { ...options, min: options.min ?? 0, max: options.max ?? (kind === 'share' ? 1 : undefined) }
  if (read.value >= limits.min && read.value <= (limits.max ?? LARGEST)) return read
  return { error: `${read.understood} is outside what is allowed. Type ${accepted(kind, limits)}.` }
}

function accepted(kind: QuantityKind, { system = 'metric', min, max }: ParseOptions): string {
  const unit = displayUnit(kind, system)
  const show = (value: number): string => withUnit(formatPlain(value / unit.factor, unit.decimals + 2), unit.label)
  if (min !== undefined && max !== undefined) return `${examples[kind]}, between ${show(min)} and ${show(max)}`
  if (max !== undefined) return `${examples[kind]}, at most ${show(max)}`
  return min === undefined ? examples[kind] : `${examples[kind]}, at least ${show(min)}`
}

function readBeaufort(text: string): Understood | NotUnderstood | null {
  const digits = /^(?:f|bf|bft|force|beaufort)\.? ?(\d+)$/i.exec(text)?.[1] ?? /^(\d+) ?(?:bf|bft|beaufort)\.?$/i.exec(text)?.[1]
  if (digits === undefined) return null
  const beaufort = Number(digits)
  if (beaufort > 12) return { error: 'Beaufort ends at force 12.' }
  const value = beaufortSpeedMs(beaufort)
  const knots = formatPlain(value / KN_MS)
  const band = beaufort === 12 ? `${knots} kn or more` : `up to ${knots} kn`
  return { value, understood: `Beaufort ${beaufort}, ${band} = ${formatPlain(value, 1)} m/s`, beaufort }
}

function readFeetInches(text: string): Understood | NotUnderstood | null {
  const match = /^(\d{1,6}) ?(?:'|ft\.?|feet|foot)[ -]?(\d.*?) ?(?:"|in\.?|inch|inches)?$/i.exec(text)
  if (!match) return null
  const inches = readNumber(match[2] ?? '')
  if (!inches || inches.rest !== '') return null
  if (inches.value >= 12) return { error: 'After feet the inches must be under 12.' }
  const value = Number(match[1]) * FT_M + inches.value * IN_M
  return { value, understood: `${match[1]} ft ${inches.fraction ?? formatPlain(inches.value, 3)} in = ${base(value, 'length')}` }
}

function readPlain(text: string, kind: QuantityKind, system: UnitSystem): Understood | NotUnderstood {
  const number = readNumber(text)
  if (!number) return { error: 'No number could be read.' }
  const typed = number.rest.trim()
  const unit = typed === '' ? bareUnit(kind, system, number) : typedUnit(kind, typed)
  if (!unit) return { error: `“${typed}” is not a unit read here.` }
  const value = number.value * unit.factor
  if (Math.abs(value) > LARGEST) return { error: 'The number is too large.' }
  const shown = withUnit(number.fraction ?? formatPlain(number.value, 6), unit.label)
  const sameUnit = unit.label === displayUnit(kind, 'metric').label && number.fraction === undefined
  const understood = sameUnit ? shown : `${shown} = ${base(value, kind)}`
  return { value, understood, ...inchSize(kind, unit.label, value) }
}

function bareUnit(kind: QuantityKind, system: UnitSystem, number: { value: number, fraction?: string }): { label: string, factor: number } {
  if (kind === 'diameter' && number.fraction !== undefined) return displayUnit(kind, 'imperial')
  if (kind === 'share' && number.value <= 1) return { label: '', factor: 1 }
  return displayUnit(kind, system)
}

function inchSize(kind: QuantityKind, label: string, value: number): { sizeIn?: string } {
  if (kind !== 'diameter' || label !== 'in' || !(value > 0 && value <= 1)) return {}
  const size = formatInches(value).replace('"', '')
  return size.includes('.') ? {} : { sizeIn: size }
}

/** The value in the metric unit it is shown in, to one digit more than a table needs. */
function base(value: number, kind: QuantityKind): string {
  const unit = displayUnit(kind, 'metric')
  return withUnit(formatPlain(value / unit.factor, unit.decimals + 1), unit.label)
}

function withUnit(number: string, label: string): string {
  return label === '°' ? `${number}${label}` : `${number} ${label}`.trim()
}
