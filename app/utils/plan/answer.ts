import type { PlanAnswer } from '#shared/types/plan'
import type { RankingRequest } from '#shared/types/ranking'
import { FieldError } from '#shared/utils/fieldError'
import { answerPlan } from '#shared/ranking/plan'
import { answerRode } from '#shared/rode/answer'
import { snubberAdvice } from '#shared/rode/snubber'
import type { SnubberAdvice } from '#shared/types/rode'
import type { Issue, Strongpoints } from '~/utils/plan/read'
import { quantityKeys, quantityWords, windageKeyList, windageKeys } from '~/utils/plan/words'

/** Load, rode and snubber of a plan: what the page shows at once, before any ranking. */
export interface PlanFigures { plan: PlanAnswer, snubber: SnubberAdvice | null }

/** The word of the sentence that a refused field belongs to; the length of the boat where none is nearer. */
export function wordForField(field: string): string {
  const plain = field.replace(/\.sizeIn$/, '.diameterMm')
  const found = quantityKeys.find(key => quantityWords[key].path === plain || quantityWords[key].path === `rode.${plain}`)
  if (found) return found
  if (field.startsWith('seabeds')) return `bed${/^seabeds\.(\d+)/.exec(field)?.[1] ?? 0}`
  const part = /^boat\.windage\.(\d+)/.exec(field)?.[1]
  if (part !== undefined) return windageKeyList[Number(part)] ?? 'hull'
  return field.startsWith('own') ? 'own' : 'length'
}

/** A message as it stands beside its control: without the field's own name in front. */
export function messageFor(field: string, message: string): string {
  const bare = message.startsWith(field) ? message.slice(field.length).trim() : message
  return `${bare.charAt(0).toUpperCase()}${bare.slice(1)}${/[.!?]$/.test(bare) ? '' : '.'}`
}

/**
 * Works out load, rode and snubber of a plan.
 *
 * @returns the figures, or the issue that stands in the way
 */
export function answerFigures(request: RankingRequest, strongpoints: Strongpoints): PlanFigures | Issue {
  try {
    const plan = answerPlan(request)
    const { load, heightM, energyJ } = plan
    const strength = plan.rode && load.designN !== null && load.designN > 0 && (strongpoints.shackles ?? strongpoints.overRoller)
      ? answerRode({ ...request.rode, ...strongpoints, heightM, horizontalLoadN: load.designN })
      : plan.rode
    const rode = plan.rode && strength && { ...plan.rode, strength: strength.strength, weakest: strength.weakest }
    const snubber = snubberAdvice({
      rode: request.rode, heightM, depthM: request.depthM, designN: load.designN, steadyN: load.survey.gustN, energyJ,
    })
    return { plan: { ...plan, rode }, snubber }
  }
  catch (error) {
    if (error instanceof FieldError) return { key: wordForField(error.field), message: messageFor(error.field, error.message) }
    if (error instanceof RangeError) return { key: 'length', message: messageFor('', error.message) }
    throw error
  }
}

/** Names of the windage parts in the order of a request. */
export const windageNames = windageKeyList.map(key => windageKeys[key])
