import type { ModificationEstimate } from '#shared/types/holding'
import type { ModificationRatio } from '#shared/types/modification'
import { z90 } from '#shared/stats/normal'

/** Ratio of modified to unmodified holding: the median and the ends of its 90 % interval, exp(m -/+ 1.645 sd). */
export function modificationRatio({ design, seabed, lnRatio, lnSd, pulls, pairs, verdict }: ModificationEstimate): ModificationRatio {
  const at = (sds: number) => Math.exp(lnRatio + sds * lnSd)
  return { design, seabed, ratio: { median: at(0), low90: at(-z90), high90: at(z90) }, pulls, pairs, verdict }
}
