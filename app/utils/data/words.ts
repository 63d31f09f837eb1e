import type { EstimateMove, ReleaseChanges } from '#shared/types/release'
import { seabedFacts } from '#shared/seabed/seabeds'
import { counted, dayInWords, listed, seabedNames } from '~/utils/reading/words'

/** "212 kB" and the like, of a thousand bytes each. */
export function sizeInWords(bytes: number): string {
  if (bytes < 1000) return `${bytes} B`
  return bytes < 1_000_000 ? `${Math.round(bytes / 1000)} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`
}

/** "16 September 2026" of a moment in UTC. */
export const momentInWords = (moment: string): string => dayInWords(moment.slice(0, 10))

/** "+12 %" or "−8 %" of a ratio. */
export function changeInWords(ratio: number): string {
  const percent = Math.round((ratio - 1) * 100)
  return percent === 0 ? 'under 1 %' : `${percent > 0 ? '+' : '−'}${Math.abs(percent)} %`
}

/** What came in since the release before, in one sentence. */
export function newcomersInWords({ since, pulls, corrections, trials, designs, modifications, seabeds }: ReleaseChanges): string {
  const more = (count: number, one: string) => counted(count, since === null ? one : `more ${one}`, since === null ? `${one}s` : `more ${one}s`)
  const corrected = corrections === 0 ? 'no pull was corrected' : `${counted(corrections, 'pull')} ${corrections === 1 ? 'was' : 'were'} corrected`
  const fresh = [
    ...(designs.length ? [counted(designs.length, 'design') + (since === null ? '' : ` (${listed(designs.map(({ name }) => name))})`)] : []),
    ...(modifications.length ? [counted(modifications.length, 'modification')] : []),
    ...(seabeds.length ? [since === null ? counted(seabeds.length, 'seabed') : seabedNames(seabeds)] : []),
  ]
  const named = fresh.length === 0 ? '' : since === null ? ` of ${listed(fresh)}` : `; new are ${listed(fresh)}`
  return `${more(pulls, 'pull')} in ${more(trials.length, 'trial')}${named}; ${corrected}.`
}

/** How far the estimates moved, in words and numbers. */
export function movesInWords({ since, compared, added, movedMuch, outside, widthRatio }: ReleaseChanges): string {
  if (since === null || compared === 0) return `${counted(added, 'estimate')}, the first there are.`
  const width = widthRatio === null ? '' : ` In the middle, an interval is ${widthRatio.toFixed(2)} times as wide as it was.`
  const beyond = outside === 0 ? 'none lies' : outside === 1 ? '1 lies' : `${outside} lie`
  return `Of ${counted(compared, 'estimate')} that both releases give, ${movedMuch} moved by more than 15 %, and ${beyond} outside the earlier 90 % interval.${width}${added ? ` ${counted(added, 'estimate')} came in.` : ''}`
}

const pullsOf = (pulls: number) => pulls === 0 ? 'no pull' : counted(pulls, 'pull')

/** The one that moved furthest, in a sentence; the loads come as words. */
export function furthestInWords({ name, seabed, before, after, ratio }: EstimateMove, force: (loadN: number) => string): string {
  return `The furthest: ${name} on ${seabedFacts(seabed).name}, from ${force(before.median)} to ${force(after.median)} (${changeInWords(ratio)}), with ${pullsOf(before.pulls)} then and ${pullsOf(after.pulls)} now.`
}
