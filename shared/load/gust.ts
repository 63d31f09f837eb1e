import { exposures } from '#shared/types/words'
import type { Exposure } from '#shared/types/words'
import type { Wind } from '#shared/types/load'
import { FieldError } from '#shared/utils/fieldError'
import { within } from '#shared/load/within'

/** The exposure taken when none is given. */
export const defaultExposure: Exposure = 'offshoreWind'

const factors: Readonly<Record<Exposure, number>> = { atSea: 1.23, onshoreWind: 1.38, offshoreWind: 1.52, inland: 1.66 }

/** Height taken for the centre of a boat's windage, m (ours). */
export const windageCentreM = 2

/**
 * Ratio of the 3-second gust to the 10-minute mean wind at 10 m.
 * Source: WMO/TD-No. 1555 (Harper, Kepert and Ginger 2010) table 1.1. Offshore wind is the default (ours): most anchorages lie under the land.
 *
 * @throws RangeError for an exposure that is not one of the four
 */
export function gustFactor(exposure: Exposure = defaultExposure): number {
  if (Object.hasOwn(factors, exposure)) return factors[exposure]
  throw new FieldError('wind.exposure', `wind.exposure must be one of ${exposures.join(', ')}, got ${String(exposure)}`)
}

/**
 * Ratio of the gust to the speed entered: the gust factor for a mean, 1 for a gust.
 *
 * @throws RangeError for an unknown kind or exposure
 */
export function gustRatio(wind: Pick<Wind, 'kind' | 'exposure'>): number {
  const factor = gustFactor(wind.exposure)
  if (wind.kind === 'mean') return factor
  if (wind.kind === 'gust') return 1
  throw new FieldError('wind.kind', `wind.kind must be mean or gust, got ${String(wind.kind)}`)
}

/**
 * A wind said as both: its 10-minute mean and its 3-second gust, at the height it was entered for.
 *
 * @param wind speed in m/s, 0 to 150, entered as a mean or as a gust
 * @returns m/s
 * @throws RangeError for a speed outside that range, or an unknown kind or exposure
 */
export function meanAndGust(wind: Pick<Wind, 'speedMs' | 'kind' | 'exposure'>): { meanMs: number, gustMs: number } {
  const speedMs = within('wind.speedMs', wind.speedMs, 0, 150)
  const gustMs = speedMs * gustRatio(wind)
  return { meanMs: wind.kind === 'mean' ? speedMs : gustMs / gustFactor(wind.exposure), gustMs }
}

/**
 * Ratio of the wind at a height to the wind at 10 m: V(z) = V10 (z/10)^(1/7), for a forecast given for 10 m.
 * Source: UFC 4-159-03, from memory. Heights below 1 m are taken as 1 m.
 *
 * @param heightM height of the windage's centre above the water, m, 0 to 100; 2 m by default (ours)
 * @throws RangeError outside that range
 */
export function heightFactor(heightM = windageCentreM): number {
  return (Math.max(within('heightM', heightM, 0, 100), 1) / 10) ** (1 / 7)
}
