import type { RankedRow, RankedSeabed } from '#shared/types/ranking'
import { seabedFacts } from '#shared/seabed/seabeds'
import type { RankContext } from '#shared/ranking/context'
import { hasEvidence, leastDays, leastPulls } from '#shared/ranking/evidence'
import { chanceInWords, counted, inKg, inKn, inPercent, inWords } from '#shared/ranking/plainWords'

/** Below this uplift factor the rode's angle is what would change the answer first. */
const muchLost = 0.9
/** Below this share set at the first try, the reader is told to count on trying again. */
const oftenUnset = 0.75

function evidence(entry: RankedSeabed): string {
  if (entry.pulls === 0) return 'No pulls here: estimated from its family and other seabeds, so wide.'
  const limit = entry.atLimit > 0 ? `, ${entry.atLimit} of them to the rig's limit` : ''
  const scaled = entry.scaledFromKg === null ? '' : `, scaled from ${inKg(entry.scaledFromKg)}`
  return `${counted(entry.pulls, 'pull')} on ${counted(entry.days, 'day')}${limit}${scaled}.`
}

function uplift(factor: number): string {
  return factor > 0.995 ? 'the pull is flat' : `the rode's angle leaves ${inPercent(factor)} of that`
}

function setting({ setShare }: RankedSeabed): string {
  if (setShare === null || setShare.n === 0 || setShare.mean >= oftenUnset) return ''
  return ` It set at the first try in an estimated ${inPercent(setShare.mean)}: count on trying again.`
}

/** What would change the answer, the strongest first; one sentence. */
function change(context: RankContext, row: RankedRow, entry: RankedSeabed): string {
  const thin = row.seabeds.find((other, i) => context.mix[i]?.fit !== null && !hasEvidence(other))
  if (thin !== undefined) return `Would change it: more pulls on ${seabedFacts(thin.seabed).name}, at least ${leastPulls} on at least ${leastDays} days.`
  const wind = entry.holdingWind
  if ((entry.chance ?? 0) >= context.target) {
    if (wind !== null && 'atLeast' in wind && wind.atLeast) {
      return `Would change it: pulls to a higher load; none here showed more than ${inWords(wind).replace('at least ', '')}.`
    }
    const past = wind !== null && 'gustMs' in wind ? `a wind past its holding wind, ${inWords(wind)}, or ` : ''
    return `Would change it: ${past}a worse seabed than those named.`
  }
  if (entry.upliftFactor < muchLost) {
    return `Would change it: more chain or a longer rode, so that the pull lies flat and gives back the ${inPercent(1 - entry.upliftFactor)} lost to its angle.`
  }
  const { survey } = row.smallestServing
  const target = inPercent(context.target)
  if (survey !== null) return `Would change it: a bigger one; ${inKg(survey)} reaches ${target} on every seabed here.`
  return `Would change it: less wind or a better seabed; none of its sizes reaches ${target} here.`
}

/**
 * Why a row stands where it does, in words: load, holding with its interval, uplift factor, pulls on days, and what would
 * change the answer. About its worst seabed, since that decides the order.
 */
export function explainRow(context: RankContext, row: RankedRow, massKg: number): string {
  const entry = row.seabeds.find(({ seabed }) => seabed === row.worst?.seabed)
  if (entry === undefined || entry.holdingN === null || entry.chance === null) return 'Never pulled on these seabeds, so nothing can be said of it here.'
  const { median, low90, high90 } = entry.holdingN
  const others = context.mix.filter(({ fit }) => fit !== null).length > 1
  const where = `On ${seabedFacts(entry.seabed).name}${others ? ', its worst seabed here,' : ''}`
  return `${where} at ${inKg(massKg)} it holds an estimated ${inKn(median)} (90 % interval ${inKn(low90)} to ${inKn(high90)}) against ${inKn(context.demand.surveyN)} asked; `
    + `${uplift(entry.upliftFactor)}: a chance of ${chanceInWords(entry.chance)} once set. ${evidence(entry)}${setting(entry)} ${change(context, row, entry)}`
}
