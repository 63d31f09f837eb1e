import { formatFeetInches, formatInches, formatNumber, formatQuantity, unitLabel } from '#shared/units/format'
import type { QuantityKind } from '#shared/units/systems'
import { usePreferencesStore } from '~/stores/preferences'

/** Decimals that a figure can bear: two or three digits. */
const forceDecimals = (loadN: number): number => loadN < 995 ? 2 : loadN < 9950 ? 1 : 0

/** Prints SI values in the reader's units. */
export function useShow() {
  const preferences = usePreferencesStore()
  const system = computed(() => preferences.units)
  const imperial = computed(() => system.value === 'imperial')

  return {
    system,
    unit: (kind: QuantityKind): string => unitLabel(kind, system.value),
    number: (value: number, kind: QuantityKind, decimals?: number): string => formatNumber(value, kind, system.value, { decimals }),
    length: (lengthM: number, decimals = 1): string =>
      imperial.value && lengthM >= 0 && lengthM < 30 && decimals > 0 ? formatFeetInches(lengthM) : formatQuantity(lengthM, 'length', system.value, { decimals: imperial.value ? 0 : decimals }),
    mass: (massKg: number): string => formatQuantity(massKg, 'mass', system.value, massKg >= 100 ? { decimals: 0 } : {}),
    speed: (speedMs: number): string => formatQuantity(speedMs, 'speed', system.value, { decimals: system.value === 'metric' ? 1 : 0 }),
    force: (loadN: number): string => formatQuantity(loadN, 'force', system.value, imperial.value ? { decimals: 0 } : { decimals: forceDecimals(loadN) }),
    forceNumber: (loadN: number): string => formatNumber(loadN, 'force', system.value, { decimals: imperial.value ? 0 : forceDecimals(loadN) }),
    area: (areaM2: number): string => formatQuantity(areaM2, 'area', system.value, { decimals: areaM2 < 1 ? 2 : 1 }),
    diameter: (diameterM: number): string => imperial.value ? formatInches(diameterM) : formatQuantity(diameterM, 'diameter', system.value),
    degrees: (deg: number): string => `${deg.toFixed(deg > 0 && deg < 9.95 ? 1 : 0)}°`,
    percent: (share: number): string => share < 0.01 ? 'under 1 %' : share > 0.99 ? 'over 99 %' : `${(share * 100).toFixed(0)} %`,
  }
}

export type Show = ReturnType<typeof useShow>
