import type { ComparisonAnswer, ComparisonRequest } from '#shared/types/comparison'
import { asked } from '~/utils/asked'
import type { Asked } from '~/utils/asked'

/** A comparison, rendered with the page; null while there are not two anchors to compare. */
export function useComparison(request: ComparisonRequest | null) {
  return useAsyncData(`comparison:${JSON.stringify(request)}`, async (): Promise<Asked<ComparisonAnswer> | null> =>
    request && asked(() => $fetch<ComparisonAnswer>('/api/comparisons', { method: 'POST', body: request, retry: 0 })), { deep: false })
}
