import type { ModificationAnswer, ModificationsAnswer, ModificationWorthAnswer } from '#shared/types/modification'
import type { RankingRequest } from '#shared/types/ranking'
import { asked } from '~/utils/asked'
import type { Asked } from '~/utils/asked'

/** Every modification, rendered with the page. */
export function useModifications() {
  return useAsyncData('modifications', (): Promise<Asked<ModificationsAnswer>> => asked(() => $fetch<ModificationsAnswer>('/api/modifications', { retry: 0 })), { deep: false })
}

/** One modification, rendered with the page, and what it is worth for the reader's plan where there is one. */
export function useModification(slug: string, plan: RankingRequest | null) {
  return useAsyncData(`modification:${slug}:${JSON.stringify(plan)}`, async () => {
    const found: Asked<ModificationAnswer> = await asked(() => $fetch<ModificationAnswer>(`/api/modifications/${encodeURIComponent(slug)}`, { retry: 0 }))
    const worth: Asked<ModificationWorthAnswer> | null = found.answer && plan
      ? await asked(() => $fetch<ModificationWorthAnswer>('/api/modification-worths', { method: 'POST', body: { modification: slug, plan }, retry: 0 }))
      : null
    return { found, worth }
  }, { deep: false })
}
