import type { RankingRequest } from '#shared/types/ranking'
import { carriedPlan, carriesPlan } from '~/utils/plan/carried'
import { readPlan } from '~/utils/plan/read'
import { readQuery } from '~/utils/plan/typed'
import { usePreferencesStore } from '~/stores/preferences'

/** The plan that an address carries: as a request, as the words of an address, and what is wrong with it. */
export interface CarriedPlan { request: RankingRequest | null, query: Record<string, string | string[]>, note: string | null }

/** Reads the plan in the address of this page; none where it carries none, or where a word of it cannot be read. */
export function useCarriedPlan(): CarriedPlan {
  const { query } = useRoute()
  const preferences = usePreferencesStore()
  if (!carriesPlan(query)) return { request: null, query: {}, note: null }
  const { request, issues } = readPlan(readQuery(query), preferences.units)
  const [first] = issues
  const note = request ? null : `The plan in the address was left out: ${first?.message ?? 'it cannot be read.'}`
  return { request, query: carriedPlan(query), note }
}
