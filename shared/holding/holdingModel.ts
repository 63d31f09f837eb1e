import { anchorDayKey, publishedSize, pullEffects, sdNames } from '#shared/holding/effects'
import type { Effect, SdName } from '#shared/holding/effects'
import { columnsOf, groupOf } from '#shared/holding/columns'
import { upliftFactor } from '#shared/rode/uplift'
import type { MixedModel } from '#shared/stats/mixedModel'
import { heldInterval, middleLoadN } from '#shared/trial/observation'
import type { HeldInterval } from '#shared/trial/observation'
import type { PullRecord } from '#shared/types/holding'

/** Scales of the half-normal priors on the sds and on sigma. */
export const sdPriorScale = 0.5
export const sigmaPriorScale = 1

/** The holding model of a set of pulls, ready for the solver, and how its effects are found again. */
export interface HoldingModel {
  mixed: MixedModel
  /** mean of ln of the pulls' middle loads, ln N; every ln holding of the solver is against it */
  centre: number
  columnOf: Map<string, number>
  /** groups that the pulls carry, in the solver's order */
  groups: SdName[]
  fitted: PullRecord[]
}

/** `likelihood`: no priors on means, exponents and sds, and the means maximised, not integrated: for comparison with other programs. */
export interface HoldingModelOptions { likelihood?: boolean }

interface Fitted { pull: PullRecord, interval: HeldInterval }

/** The pulls that enter the fit, with their intervals. */
export function fittedPulls(pulls: readonly PullRecord[]): Fitted[] {
  return pulls.flatMap((pull) => {
    const interval = heldInterval(pull)
    return interval === null ? [] : [{ pull, interval }]
  })
}

/** What is known of a pull's ln holding before any effect: b_s ln(m/15 kg) + ln r(angle). */
export function publishedPart(pull: PullRecord): number {
  return publishedSize(pull) + Math.log(upliftFactor(pull.shankAngleDeg * Math.PI / 180))
}

/** Centre of a set of intervals, ln N. Scaling all loads by k moves it by ln k. */
export function centreOf(fitted: readonly Fitted[]): number {
  return fitted.reduce((sum, { interval }) => sum + Math.log(middleLoadN(interval)), 0) / fitted.length
}

function numbered(keys: readonly string[]): Map<string, number> {
  return new Map([...new Set(keys)].map((key, index) => [key, index]))
}

function sparseRows(rows: readonly Effect[][], columnOf: Map<string, number>): Pick<MixedModel, 'rowStart' | 'cols' | 'coefs'> {
  const rowStart = new Int32Array(rows.length + 1)
  rows.forEach((row, i) => (rowStart[i + 1] = rowStart[i]! + row.length))
  const col = (effect: Effect): number => columnOf.get(effect.key)!
  const effects = rows.flatMap(row => [...row].sort((a, b) => col(a) - col(b)))
  return {
    rowStart,
    cols: Int32Array.from(effects, col),
    coefs: Float64Array.from(effects, effect => effect.coefficient),
  }
}

/**
 * Builds the model of section "Holding" on /method from pulls in canonical order.
 *
 * @throws RangeError when no pull enters the fit
 */
export function holdingModel(pulls: readonly PullRecord[], options: HoldingModelOptions = {}): HoldingModel {
  const fitted = fittedPulls(pulls)
  if (fitted.length === 0) throw new RangeError('pulls that set must be at least 1, got 0')
  const likelihood = options.likelihood ?? false
  const records = fitted.map(({ pull }) => pull)
  const columns = columnsOf(records)
  const columnOf = new Map(columns.map((column, index) => [column.key, index]))
  const groups = sdNames.filter(name => name === 'anchorDay' || columns.some(column => column.kind === name))
  const rank = new Map<number, number>(groups.map((name, index) => [groupOf(name), index]))
  const days = numbered(records.map(anchorDayKey))
  const centre = centreOf(fitted)
  const known = (end: number, pull: PullRecord): number => Math.log(end) - centre - publishedPart(pull)
  const mixed: MixedModel = {
    lo: Float64Array.from(fitted, ({ pull, interval }) => known(interval.heldN, pull)),
    hi: Float64Array.from(fitted, ({ pull, interval }) => known(interval.movedN, pull)),
    ...sparseRows(records.map(pullEffects), columnOf),
    group: Int32Array.from(columns, column => rank.get(groupOf(column.kind)) ?? -1),
    priorSd: Float64Array.from(columns, column => (likelihood && column.kind !== 'rig' ? Infinity : column.priorSd)),
    day: Int32Array.from(records, pull => days.get(anchorDayKey(pull))!),
    days: days.size,
    dayGroup: groups.indexOf('anchorDay'),
    groups: groups.length,
    sdScale: new Float64Array(groups.length).fill(likelihood ? Infinity : sdPriorScale),
    sigmaScale: likelihood ? Infinity : sigmaPriorScale,
    maximised: Uint8Array.from(columns, ({ kind }) => (likelihood && (kind === 'seabed' || kind === 'exponent') ? 1 : 0)),
  }
  return { mixed, centre, columnOf, groups, fitted: records }
}
