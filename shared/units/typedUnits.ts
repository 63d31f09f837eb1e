import { DEG_RAD, FT_M, IN_M, KGF_N, KMH_MS, KN_MS, LBF_N, LB_KG, MPH_MS } from '#shared/units/constants'
import type { QuantityKind } from '#shared/units/systems'

/** A unit that may be typed: how it is printed back, and what one of it is in SI. */
export interface TypedUnit { label: string, factor: number }

/** Spellings (lower case, no spaces) of a unit. */
function unit(label: string, factor: number, ...spellings: string[]): [string, TypedUnit][] {
  return [label.toLowerCase(), ...spellings].map(spelling => [spelling, { label, factor }])
}

const lengths = [
  ...unit('m', 1, 'metre', 'metres', 'meter', 'meters'),
  ...unit('cm', 0.01, 'centimetre', 'centimetres', 'centimeter', 'centimeters'),
  ...unit('mm', 0.001, 'millimetre', 'millimetres', 'millimeter', 'millimeters'),
  ...unit('ft', FT_M, '\'', 'foot', 'feet'),
  ...unit('in', IN_M, '"', 'inch', 'inches'),
]

const tables: Readonly<Record<QuantityKind, ReadonlyMap<string, TypedUnit>>> = {
  length: new Map(lengths),
  diameter: new Map(lengths),
  mass: new Map([
    ...unit('kg', 1, 'kilo', 'kilos', 'kilogram', 'kilograms', 'kilogramme', 'kilogrammes'),
    ...unit('g', 0.001, 'gram', 'grams', 'gramme', 'grammes'),
    ...unit('t', 1000, 'tonne', 'tonnes'),
    ...unit('lb', LB_KG, 'lbs', 'pound', 'pounds'),
  ]),
  speed: new Map([
    ...unit('m/s', 1, 'ms-1', 'mps'),
    ...unit('kn', KN_MS, 'kt', 'kts', 'kns', 'knot', 'knots'),
    ...unit('km/h', KMH_MS, 'kmh', 'kph', 'kmh-1'),
    ...unit('mph', MPH_MS, 'mi/h'),
  ]),
  force: new Map([
    ...unit('N', 1, 'newton', 'newtons'),
    ...unit('daN', 10),
    ...unit('kN', 1000, 'kilonewton', 'kilonewtons'),
    ...unit('kgf', KGF_N, 'kg', 'kp'),
    ...unit('tf', 1000 * KGF_N, 't', 'tonne', 'tonnes'),
    ...unit('lbf', LBF_N, 'lb', 'lbs', 'pound', 'pounds'),
  ]),
  area: new Map([
    ...unit('m²', 1, 'm2', 'm^2', 'sqm', 'squaremetre', 'squaremetres', 'squaremeter', 'squaremeters'),
    ...unit('ft²', FT_M ** 2, 'ft2', 'ft^2', 'sqft', 'sq.ft', 'squarefoot', 'squarefeet'),
  ]),
  angle: new Map([...unit('°', DEG_RAD, 'deg', 'degree', 'degrees'), ...unit('rad', 1, 'radian', 'radians')]),
  share: new Map(unit('%', 0.01, 'percent', 'pct')),
}

/** The unit that a spelling means for a kind of quantity; spaces, case and a last full stop do not matter. Undefined for a spelling not read. */
export function typedUnit(kind: QuantityKind, spelling: string): TypedUnit | undefined {
  return tables[kind].get(spelling.toLowerCase().replace(/\s/g, '').replace(/\.$/, ''))
}

/** What may be typed, in words, for messages: examples of a kind of quantity. */
export const examples: Readonly<Record<QuantityKind, string>> = {
  length: 'a length such as 11.2 m, 35 ft or 35\' 2"',
  diameter: 'a diameter such as 10 mm or 5/16"',
  mass: 'a mass such as 4500 kg, 4.5 t or 9900 lb',
  speed: 'a speed such as 30 kn, 15 m/s, 55 km/h, 35 mph or F8',
  force: 'a force such as 5.3 kN, 540 kgf or 1200 lbf',
  area: 'an area such as 4.5 m² or 48 ft²',
  angle: 'an angle such as 30° or 0.5 rad',
  share: 'a share such as 30 % or 0.3',
}
