import type { PulledSeabed } from './holding'
import type { Family } from '../../../shared/types/words'
import { anchorDaySd, exponents, firstPullWeak, medianKnAt20Kg, notFreshShare, pulledSeabeds, pullSd, rigErrorLn } from './holding'
import { modificationRatios, modificationSeabeds } from './modifications'
import { familyTemper, neverSetRange, reluctance, resetPenalty, setAfterDraggingShare } from './setting'

function lookUp<T>(table: Readonly<Record<string, T>>, key: string, what: string): T {
  const found = Object.hasOwn(table, key) ? table[key] : undefined
  if (found === undefined) throw new RangeError(`${what} must be one of ${Object.keys(table).join(', ')}, got ${key}`)
  return found
}

/** True exponent of mass on a seabed. */
export function trueExponent(seabed: PulledSeabed): number {
  const { published, departure } = lookUp(exponents, seabed, 'seabed')
  return published + departure
}

/** True ln median holding, ln N, flat pull, of a design at a mass (kg, over 0) on a seabed, whether pulled there or not. */
export function trueLnMedian(design: string, seabed: PulledSeabed, massKg: number): number {
  if (!(massKg > 0 && massKg < Infinity)) throw new RangeError(`massKg must be over 0 and finite, got ${massKg}`)
  const exponent = trueExponent(seabed)
  const row = lookUp(medianKnAt20Kg, design, 'design')
  const medianN = 1000 * (row[pulledSeabeds.indexOf(seabed)] ?? NaN)
  return Math.log(medianN) + exponent * Math.log(massKg / 20)
}

/** True ratio of modified to unmodified holding; 1 on seabeds where it was never tried. */
export function trueModificationRatio(modification: string, seabed: PulledSeabed): number {
  const at = (modificationSeabeds as readonly string[]).indexOf(seabed)
  return lookUp(modificationRatios, modification, 'modification')[at] ?? 1
}

/** True share of pulls that never set. */
export function trueNeverSetShare(design: string, seabed: PulledSeabed): number {
  const [low, high] = lookUp(neverSetRange, seabed, 'seabed')
  return low + (high - low) * lookUp(reluctance, design, 'design')
}

/** True share set at the first try, without dragging, of pulls that were not fouled. */
export function trueFirstTryShare(design: string, seabed: PulledSeabed): number {
  return (1 - trueNeverSetShare(design, seabed)) * (1 - lookUp(setAfterDraggingShare, seabed, 'seabed'))
}

/** What a family does after a breakout and in a veer pull, on a seabed. */
export function trueTemper(family: Family, seabed: PulledSeabed) {
  const temper = familyTemper[family]
  if (!temper) throw new RangeError(`family must be one of ${Object.keys(familyTemper).join(', ')}, got ${family}`)
  const penalty = lookUp(resetPenalty, seabed, 'seabed')
  return {
    breakoutFactor: temper.breakoutFactor,
    resetShare: Math.max(0.05, temper.reset - penalty),
    veerStaysShare: temper.veerStays,
    veerResetsShare: Math.max(0.05, temper.veerResets - penalty),
  }
}

/** ln median at 15 kg of every design on every pulled seabed: the numbers that estimates are checked against. */
function lnMedians15Kg(): Record<string, Record<PulledSeabed, number>> {
  return Object.fromEntries(Object.keys(medianKnAt20Kg).map(design => [
    design,
    Object.fromEntries(pulledSeabeds.map(seabed => [seabed, trueLnMedian(design, seabed, 15)])) as Record<PulledSeabed, number>,
  ]))
}

/** The written-down true values, gathered for checks. */
export const truth = {
  seabeds: pulledSeabeds,
  lnMedian15Kg: lnMedians15Kg(),
  exponents: Object.fromEntries(pulledSeabeds.map(s => [s, trueExponent(s)])) as Record<PulledSeabed, number>,
  modificationSeabeds,
  modificationRatios,
  pullSd,
  anchorDaySd,
  trialSd: 0,
  rigErrorLn,
  firstPullWeak,
  notFreshShare,
} as const
