import type { RankingAnswer, RankingRequest } from '#shared/types/ranking'
import type { RankingReply } from '~/composables/usePlanState'
import { messageFor, wordForField } from '~/utils/plan/answer'

const pauseMs = 160

interface Refusal { statusCode?: number, data?: { statusCode?: number, message?: string, fields?: Record<string, string> } }

/** What a refused or failed ranking means to the reader; load and rode stand in any case. */
function explain(error: unknown): Omit<RankingReply, 'asked'> {
  const { statusCode, data } = error as Refusal
  const status = data?.statusCode ?? statusCode
  if (status === 422) {
    const issues = Object.entries(data?.fields ?? {}).map(([field, message]) => ({ key: wordForField(field), message: messageFor(field, message) }))
    return { answer: null, problem: 'The ranking needs the words marked above; load and rode stand as they are.', issues }
  }
  const problem = status === 503
    ? 'No estimates have been worked out from the pulls yet, so nothing can be ranked. Load and rode above do not need them and stand. Try again in a minute.'
    : status === 429
      ? 'Too many rankings were asked for from your address in a short time. Load and rode still follow your words; the ranking does again in a minute.'
      : 'The ranking could not be fetched just now. Load and rode above are worked out here and stand.'
  return { answer: null, problem, issues: [] }
}

async function ask(request: RankingRequest | null, signal?: AbortSignal): Promise<RankingReply | null> {
  if (!request) return null
  const asked = { ownMassKg: request.own?.massKg ?? null, target: request.target ?? 0.9 }
  try {
    const answer = await $fetch<RankingAnswer>('/api/rankings', { method: 'POST', body: request, signal, retry: 0 })
    return { answer, asked, problem: null, issues: [] }
  }
  catch (error) {
    return signal?.aborted ? null : { ...explain(error), asked }
  }
}

/**
 * The ranking of a plan: rendered with the page, then asked again as the plan changes; an answer that has been overtaken is dropped.
 *
 * @param request the plan, null while a word cannot be read
 * @returns the newest reply; `rendered` is to be awaited once, in setup
 */
export function useRanking(request: () => RankingRequest | null) {
  const rendered = useAsyncData('ranking', () => ask(request()), { deep: false })
  const reply = rendered.data
  const waiting = ref(false)
  let pause: ReturnType<typeof setTimeout> | undefined
  let running: AbortController | undefined

  async function follow(): Promise<void> {
    running?.abort()
    const mine = running = new AbortController()
    const next = await ask(request(), mine.signal)
    if (mine.signal.aborted) return
    if (next) reply.value = next
    waiting.value = false
  }

  watch(() => JSON.stringify(request()), (now) => {
    clearTimeout(pause)
    if (now === 'null') return
    waiting.value = true
    pause = setTimeout(follow, pauseMs)
  })
  onScopeDispose(() => {
    clearTimeout(pause)
    running?.abort()
  })
  return { reply, waiting, rendered }
}
