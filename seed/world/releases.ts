import type { World } from './types'

/** A release of the demo world: the pulls published by the last evening of a season. */
export interface WorldRelease { version: string, cutAt: string, notes: string }

const seasons: readonly (readonly [season: number, notes: string])[] = [
  [2024, 'The first season: all designs, on eight seabeds. Four modifications were tried back to back, on sandy mud and on firm mud.'],
  [2025, 'The second season: cobble over sand for the first time, back-to-back pairs on soft mud and loose sand too, and three days with less chain out, so that the rode lifted.'],
  [2026, 'The third season: every seabed pulled once more, and the pairs on soft mud, sandy mud and loose sand made again.'],
]

/** One release a season, cut at the moment its last trial was published. */
export function worldReleases({ trials }: World): WorldRelease[] {
  return seasons.map(([season, notes]) => {
    const days = trials.filter(trial => trial.season === season).map(({ day }) => day).sort()
    const last = days.at(-1)
    if (last === undefined) throw new RangeError(`season must be one with trials, got ${season}`)
    return { version: String(season), cutAt: `${last}T18:00:00Z`, notes }
  })
}
