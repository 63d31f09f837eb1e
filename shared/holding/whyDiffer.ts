import { heldInterval, middleLoadN, settingOf, standsAlone } from '#shared/trial/observation'
import type { PullRecord } from '#shared/types/holding'
import { upliftFactor } from '#shared/rode/uplift'
import { DEG_RAD } from '#shared/units/constants'

/** What can set a plain mean apart from an estimate. */
export type Cause = 'later' | 'failures' | 'steps' | 'angle' | 'spread' | 'others'

/** One cause's part of ln(estimate / plain mean). The parts add up to the whole. */
export interface Part { cause: Cause, lnRatio: number }

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length

/**
 * Takes the way from a plain mean to an estimate apart, step by step: pulls made after a breakout leave; failures, counted as
 * 0, leave; each pull's load moves from the step it held to the middle of its interval; it is brought to a flat pull; the
 * mean becomes a median; and what is left comes from other pulls, other days and the family. Ours.
 *
 * @param pulls one anchor on one seabed in one trial, as the plain mean takes them
 * @param estimateN median of the fit at that mass, flat pull, N, more than 0
 * @returns null where the pulls give no plain mean above 0, or none of them enters a fit
 */
export function partsOfDifference(pulls: readonly PullRecord[], estimateN: number): Part[] | null {
  const taken = pulls.filter(pull => settingOf(pull) !== 'fouled')
  const alone = taken.filter(standsAlone)
  const fitted = alone.flatMap((pull) => {
    const interval = heldInterval(pull)
    return interval ? [{ heldN: pull.heldN, middleN: middleLoadN(interval), factor: upliftFactor(pull.shankAngleDeg * DEG_RAD) }] : []
  })
  const held = (list: readonly PullRecord[]): number => mean(list.map(pull => pull.set ? pull.heldN : 0))
  const way: [Cause | null, number][] = [
    [null, held(taken)],
    ['later', held(alone)],
    ['failures', mean(fitted.map(({ heldN }) => heldN))],
    ['steps', mean(fitted.map(({ middleN }) => middleN))],
    ['angle', mean(fitted.map(({ middleN, factor }) => middleN / factor))],
    ['spread', Math.exp(mean(fitted.map(({ middleN, factor }) => Math.log(middleN / factor))))],
    ['others', estimateN],
  ]
  if (fitted.length === 0 || !way.every(([, value]) => value > 0 && value < Infinity)) return null
  return way.slice(1).map(([cause, value], index) => ({ cause: cause ?? 'others', lnRatio: Math.log(value / (way[index]?.[1] ?? value)) }))
}

/** Closer than this, ln, they are said to agree (ours). */
const agreeLn = 0.1

const counted = (count: number, one: string, more: string): string => count === 1 ? `one ${one}` : `${count} ${more}`

function sayCause(cause: Cause, higher: boolean, pulls: readonly PullRecord[], fittedPulls: number): string {
  const alone = pulls.filter(standsAlone)
  const failed = alone.filter(pull => settingOf(pull) === 'neverSet').length
  const later = pulls.filter(pull => pull.fresh === false).length
  const limited = alone.filter(pull => pull.set && pull.movedN === null).length
  const others = fittedPulls - (alone.length - failed)
  switch (cause) {
    case 'later': return `the mean counts ${counted(later, 'pull', 'pulls')} made after a breakout, which the estimate leaves out`
    case 'failures': return `the mean counts ${counted(failed, 'pull that never set', 'pulls that never set')} as 0, while the estimate speaks of an anchor once set`
    case 'steps': return 'the mean takes the step that was held, while the anchor moved only at the next one and its holding lies between'
    case 'angle': return 'the rode lifted the shank, and the estimate is for a flat pull'
    case 'spread': return 'the mean is led by the highest pulls, while the estimate is a median'
    case 'others':
      if (higher && limited * 2 > alone.length) return `${counted(limited, 'pull', 'pulls')} ended at the rig's limit, and the mean cannot know how much more they would have held`
      return others > 0
        ? `the estimate also hears ${counted(others, 'other pull', 'other pulls')} of it there, on other days or at other masses`
        : 'so few pulls are drawn towards what the design and its family did elsewhere'
  }
}

/**
 * Why a plain mean and an estimate differ, in one sentence: the cause with the greatest part in the direction of the whole.
 *
 * @param pulls one anchor on one seabed in one trial, as the plain mean takes them
 * @param estimateN median of the fit at that mass, flat pull, N; null where there is none
 * @param fittedPulls how many pulls of that design on that seabed entered the fit, over all trials, 0 or more
 */
export function whyDiffer(pulls: readonly PullRecord[], estimateN: number | null, fittedPulls: number): string {
  if (estimateN === null) return 'There is no estimate to set beside it.'
  const parts = partsOfDifference(pulls, estimateN)
  if (parts === null && pulls.some(({ set, heldN }) => set && heldN > 0)) return 'The mean rests on pulls made after a breakout alone, which the estimate leaves out.'
  if (parts === null) return 'Nothing was held here, which a mean counts as 0; the estimate speaks of an anchor once set, from pulls made elsewhere.'
  const whole = parts.reduce((sum, { lnRatio }) => sum + lnRatio, 0)
  if (Math.abs(whole) < agreeLn) return 'They agree within a tenth.'
  const [first] = [...parts].sort((a, b) => (b.lnRatio - a.lnRatio) * Math.sign(whole))
  return `The estimate is ${whole > 0 ? 'higher' : 'lower'}, mostly because ${sayCause(first?.cause ?? 'others', whole > 0, pulls, fittedPulls)}.`
}
