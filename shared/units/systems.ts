import { DEG_RAD, FT_M, IN_M, KGF_N, KN_MS, LBF_N, LB_KG, MPH_MS } from '#shared/units/constants'

/** Systems a reader may choose: metric, imperial, or as at sea (m, kg, kn, and kN, kgf or lbf). */
export const unitSystems = ['metric', 'imperial', 'asAtSea'] as const
export type UnitSystem = (typeof unitSystems)[number]

/** Kinds of quantity that can be typed and shown. A diameter is in mm or in; a share is a part of one. */
export const quantityKinds = ['length', 'mass', 'speed', 'force', 'area', 'diameter', 'angle', 'share'] as const
export type QuantityKind = (typeof quantityKinds)[number]

/** Units a force may be shown in. */
export const forceUnits = ['kN', 'kgf', 'lbf'] as const
export type ForceUnit = (typeof forceUnits)[number]

/** A unit as it is printed: its label, what one of it is in SI, and the decimals it is printed with at most. */
export interface DisplayUnit { label: string, factor: number, decimals: number }

const metre: DisplayUnit = { label: 'm', factor: 1, decimals: 2 }
const kilogram: DisplayUnit = { label: 'kg', factor: 1, decimals: 1 }
const squareMetre: DisplayUnit = { label: 'm²', factor: 1, decimals: 1 }
const millimetre: DisplayUnit = { label: 'mm', factor: 0.001, decimals: 1 }
const degree: DisplayUnit = { label: '°', factor: DEG_RAD, decimals: 1 }
const percent: DisplayUnit = { label: '%', factor: 0.01, decimals: 0 }

const forces: Readonly<Record<ForceUnit, DisplayUnit>> = {
  kN: { label: 'kN', factor: 1000, decimals: 2 },
  kgf: { label: 'kgf', factor: KGF_N, decimals: 0 },
  lbf: { label: 'lbf', factor: LBF_N, decimals: 0 },
}

const metric: Readonly<Record<QuantityKind, DisplayUnit>> = {
  length: metre,
  mass: kilogram,
  speed: { label: 'm/s', factor: 1, decimals: 1 },
  force: forces.kN,
  area: squareMetre,
  diameter: millimetre,
  angle: degree,
  share: percent,
}

const systems: Readonly<Record<UnitSystem, Readonly<Record<QuantityKind, DisplayUnit>>>> = {
  metric,
  imperial: {
    ...metric,
    length: { label: 'ft', factor: FT_M, decimals: 1 },
    mass: { label: 'lb', factor: LB_KG, decimals: 1 },
    speed: { label: 'mph', factor: MPH_MS, decimals: 0 },
    force: forces.lbf,
    area: { label: 'ft²', factor: FT_M ** 2, decimals: 1 },
    diameter: { label: 'in', factor: IN_M, decimals: 3 },
  },
  asAtSea: { ...metric, speed: { label: 'kn', factor: KN_MS, decimals: 1 } },
}

/**
 * The unit that a kind of quantity is shown in, and read in when none is typed.
 *
 * @param forceUnit for a force, instead of the system's own
 */
export function displayUnit(kind: QuantityKind, system: UnitSystem, forceUnit?: ForceUnit): DisplayUnit {
  return kind === 'force' && forceUnit !== undefined ? forces[forceUnit] : systems[system][kind]
}
