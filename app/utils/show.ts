import { formatFeetInches, formatInches, formatNumber, formatQuantity, unitLabel } from '#shared/units/format'
import { displayUnit, type QuantityKind, type UnitSystem } from '#shared/units/systems'

/** Decimals that a figure can bear: two or three digits. */
const forceDecimals = (loadN: number): number => loadN < 995 ? 2 : loadN < 9950 ? 1 : 0

/** Prints SI values in the units of a reader's choice, which may change. */
export function showIn(system: { readonly value: UnitSystem }) {
  const imperial = {
    get value() {
      return system.value === 'imperial'
    },
  }
  const speedDecimals = () => system.value === 'metric' ? 1 : 0
  const speed = (speedMs: number): string => formatQuantity(speedMs, 'speed', system.value, { decimals: speedDecimals() })

  return {
    system,
    unit: (kind: QuantityKind): string => unitLabel(kind, system.value),
    number: (value: number, kind: QuantityKind, decimals?: number): string => formatNumber(value, kind, system.value, { decimals }),
    length: (lengthM: number, decimals = 1): string =>
      imperial.value && lengthM >= 0 && lengthM < 30 && decimals > 0 ? formatFeetInches(lengthM) : formatQuantity(lengthM, 'length', system.value, { decimals: imperial.value ? 0 : decimals }),
    mass: (massKg: number): string => formatQuantity(massKg, 'mass', system.value, massKg >= 100 ? { decimals: 0 } : {}),
    speed,
    /** rounded down, so that a wind which holds never reads as more than was worked out */
    holdingSpeed: (speedMs: number): string => {
      const step = displayUnit('speed', system.value).factor / 10 ** speedDecimals()
      return speed(Math.floor(speedMs / step + 1e-9) * step)
    },
    force: (loadN: number): string => formatQuantity(loadN, 'force', system.value, imperial.value ? { decimals: 0 } : { decimals: forceDecimals(loadN) }),
    forceNumber: (loadN: number): string => formatNumber(loadN, 'force', system.value, { decimals: imperial.value ? 0 : forceDecimals(loadN) }),
    area: (areaM2: number): string => formatQuantity(areaM2, 'area', system.value, { decimals: areaM2 < 1 ? 2 : 1 }),
    diameter: (diameterM: number): string => imperial.value ? formatInches(diameterM) : formatQuantity(diameterM, 'diameter', system.value),
    degrees: (deg: number): string => `${deg.toFixed(deg > 0 && deg < 9.95 ? 1 : 0)}°`,
    percent: (share: number): string => share < 0.01 ? 'under 1 %' : share > 0.99 ? 'over 99 %' : `${(share * 100).toFixed(0)} %`,
  }
}

export type Show = ReturnType<typeof showIn>
