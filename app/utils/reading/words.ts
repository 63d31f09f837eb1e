import type { Attitude, Condition, Fouling, NumberedSeabed, PullAfter, PullEnd, SettingOutcome, SoilKind, VeerOutcome } from '#shared/types/words'
import { seabedFacts } from '#shared/seabed/seabeds'

/** What is recorded of a pull, in the trade's words. */
export const settingWords: Readonly<Record<SettingOutcome, string>> = { set: 'set', setAfterDragging: 'set after dragging', neverSet: 'never set', fouled: 'fouled' }
export const endWords: Readonly<Record<PullEnd, string>> = { atTheLimit: 'held to the rig’s limit', stoppedEarly: 'stopped early', crept: 'crept', dragged: 'dragged steadily', brokeOut: 'broke out' }
export const afterWords: Readonly<Record<PullAfter, string>> = { reset: 'reset', didNotReset: 'did not reset', notTried: 'not tried' }
export const veerWords: Readonly<Record<VeerOutcome, string>> = { stayedBuried: 'stayed buried', brokeOutAndReset: 'broke out and reset', brokeOutAndDidNotReset: 'broke out and did not reset' }
export const attitudeWords: Readonly<Record<Attitude, string>> = { upright: 'upright', onItsSide: 'on its side', inverted: 'inverted', buried: 'buried', notSeen: 'not seen' }
export const foulingWords: Readonly<Record<Fouling, string>> = { clean: 'clean', mudBall: 'ball of mud', clayFilled: 'filled with clay', weed: 'weed', shell: 'shell', stoneJammed: 'stone jammed', ownChain: 'own chain' }
export const conditionWords: Readonly<Record<Condition, string>> = { undamaged: 'undamaged', bent: 'bent' }

export const soilWords: Readonly<Record<SoilKind, string>> = {
  soft: 'soft: holding grows with mass to the power 0.92',
  mixed: 'mixed: holding grows with mass to the power 0.86',
  hard: 'hard: holding grows with mass to the power 0.80',
  none: 'none: no holding figure is given here',
}

export const verdictWords: Readonly<Record<'better' | 'worse' | 'noDifference' | 'cannotTell', string>> = {
  better: 'better', worse: 'worse', noDifference: 'no difference that matters', cannotTell: 'cannot tell',
}

/** "1 pull", "12 pulls". */
export const counted = (count: number, one: string, more = `${one}s`): string => count === 1 ? `1 ${one}` : `${count} ${more}`

/** "firm mud, silt and shell". */
export function listed(words: readonly string[]): string {
  return words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}

export const seabedNames = (slugs: readonly NumberedSeabed[]): string => listed(slugs.map(slug => seabedFacts(slug).name))

const months = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December']

/** "16 April 2024" from 2024-04-16. */
export function dayInWords(day: string): string {
  const [year, month, date] = day.split('-')
  return `${Number(date)} ${months[Number(month) - 1] ?? ''} ${year}`
}

export const price = ({ minor, currency }: { minor: number, currency: string }): string => `${(minor / 100).toFixed(2)} ${currency}`
