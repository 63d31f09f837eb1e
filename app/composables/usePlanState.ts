import type { InjectionKey } from 'vue'
import type { RankingAnswer } from '#shared/types/ranking'
import type { PlanFigures } from '~/utils/plan/answer'
import { answerFigures } from '~/utils/plan/answer'
import { readPlan } from '~/utils/plan/read'
import type { Issue, PlanReading } from '~/utils/plan/read'
import { readQuery, writeQuery } from '~/utils/plan/typed'
import type { Query, TypedPlan } from '~/utils/plan/typed'
import { usePreferencesStore } from '~/stores/preferences'

/** The one state of the plan page: the words as typed, and what follows from them at once. */
export interface PlanState {
  typed: TypedPlan
  reading: ComputedRef<PlanReading>
  /** the newest figures that could be worked out; the last good ones while a word is half typed */
  figures: ComputedRef<PlanFigures | null>
  /** what is wrong, once the reader has paused: nobody is told off in the middle of a word */
  issues: Ref<Issue[]>
  issueOf: (key: string) => string | undefined
  /** replaces every word, when the address changes by itself */
  load: (query: Query) => void
  query: ComputedRef<Record<string, string | string[]>>
}

const pauseMs = 700
const planKey: InjectionKey<PlanState> = Symbol('plan')

/** Makes the plan's state from an address and hands it to everything below. */
export function providePlanState(query: Query): PlanState {
  const preferences = usePreferencesStore()
  const typed = reactive(readQuery(query))
  const reading = computed(() => readPlan(typed, preferences.units))
  const outcome = computed(() => {
    const { request, strongpoints } = reading.value
    return request && answerFigures(request, strongpoints)
  })
  const figures = computed<PlanFigures | null>(last => outcome.value && 'plan' in outcome.value ? outcome.value : last ?? null)
  const found = computed(() => outcome.value && 'message' in outcome.value ? [outcome.value] : reading.value.issues)
  const issues = ref(found.value)
  let pause: ReturnType<typeof setTimeout> | undefined
  watch(found, (next) => {
    clearTimeout(pause)
    pause = setTimeout(() => issues.value = next, next.length > 0 ? pauseMs : 0)
  })
  onScopeDispose(() => clearTimeout(pause))
  const state: PlanState = {
    typed, reading, figures, issues,
    issueOf: key => issues.value.find(issue => issue.key === key)?.message,
    load: next => Object.assign(typed, readQuery(next)),
    query: computed(() => writeQuery(typed)),
  }
  provide(planKey, state)
  return state
}

/** The plan's state, inside the plan page. */
export function usePlanState(): PlanState {
  const state = inject(planKey)
  if (!state) throw new Error('This belongs inside a page that provides a plan.')
  return state
}

/** What the server said of a plan: a ranking, or why there is none. */
export interface RankingReply { answer: RankingAnswer | null, problem: string | null, issues: Issue[] }
