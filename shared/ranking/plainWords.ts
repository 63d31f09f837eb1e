import type { HoldingWind } from '#shared/types/ranking'
import { KN_MS } from '#shared/units/constants'

/** Figures as a sailor reads them: two digits, no more than the pulls can bear. */

/** A force of N newtons in kN: `0.85 kN`, `4.1 kN`, `12 kN`. */
export function inKn(loadN: number): string {
  const kN = loadN / 1000
  if (kN < 0.995) return `${kN.toFixed(2)} kN`
  return `${kN.toFixed(kN < 9.95 ? 1 : 0)} kN`
}

/** A share of 0 to 1: `97 %`, and at the ends `less than 1 %`, `more than 99 %`. */
export function inPercent(share: number): string {
  const percent = 100 * share
  if (percent < 1) return 'less than 1 %'
  return percent > 99 ? 'more than 99 %' : `${percent.toFixed(0)} %`
}

/** A chance of 0 to 1, rounded down so that it never reads as a target it misses: 0.899 is `89 %`. */
export function chanceInWords(chance: number): string {
  if (chance < 0.01 || chance > 0.99) return inPercent(chance)
  return `${Math.floor(100 * chance + 1e-9)} %`
}

/** A mass in kg with at most one decimal: `20 kg`, `12.5 kg`. */
export function inKg(massKg: number): string {
  return `${Number(massKg.toFixed(1))} kg`
}

/** `1 pull`, `12 pulls`. */
export function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`
}

/** A holding wind in words, rounded down so that it never reads as more than was worked out: `mean 24 kn, gusting 36`, `at least mean 17 kn, gusting 26`. */
export function inWords(wind: HoldingWind): string {
  if ('reason' in wind) return wind.reason === 'beyond64kn' ? 'past gusts of 64 kn' : 'not even in calm'
  const knots = (speedMs: number) => Math.floor(speedMs / KN_MS + 1e-9)
  return `${wind.atLeast ? 'at least ' : ''}mean ${knots(wind.meanMs)} kn, gusting ${knots(wind.gustMs)}`
}
