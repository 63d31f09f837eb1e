import type { InjectionKey } from 'vue'
import type { RankingAnswer, RankingRequest } from '#shared/types/ranking'
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
  /** the plan as it is asked of the server; null while a word is wrong */
  asking: ComputedRef<RankingRequest | null>
  /** the newest figures that could be worked out; the last good ones while a word is half typed */
  figures: ComputedRef<PlanFigures | null>
  /** what is wrong, once the reader has paused: nobody is told off in the middle of a word */
  issues: Ref<Issue[]>
  /** what the server refused of a plan that could be read here */
  refused: Ref<Issue[]>
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
  const asking = computed(() => outcome.value && 'plan' in outcome.value ? reading.value.request : null)
  const found = computed(() => outcome.value && 'message' in outcome.value ? [outcome.value] : reading.value.issues)
  const issues = ref(found.value)
  let pause: ReturnType<typeof setTimeout> | undefined
  watch(found, (next) => {
    clearTimeout(pause)
    pause = setTimeout(() => issues.value = next, next.length > 0 ? pauseMs : 0)
  })
  onScopeDispose(() => clearTimeout(pause))
  const refused = ref<Issue[]>([])
  const state: PlanState = {
    typed, reading, asking, figures, issues, refused,
    issueOf: key => (issues.value.length > 0 ? issues : refused).value.find(issue => issue.key === key)?.message,
    load: next => Object.assign(typed, readQuery(next)),
    query: computed(() => writeQuery(typed)),
  }
  keepEarlyWords(state)
  provide(planKey, state)
  return state
}

/** Words typed before the page came alive would be written over by it: they are read first, and put back once it is. */
function keepEarlyWords(state: PlanState): void {
  if (import.meta.server || !useNuxtApp().isHydrating) return
  const form = document.querySelector<HTMLFormElement>('form[action="/plan"]')
  if (!form) return
  const early: Record<string, string[]> = {}
  for (const [name, value] of new FormData(form)) (early[name] ??= []).push(String(value))
  const written = (query: Query): string => JSON.stringify(writeQuery(readQuery(query)))
  onMounted(() => {
    if (written(early) !== written(state.query.value)) state.load(early)
  })
}

/** The plan's state, inside the plan page. */
export function usePlanState(): PlanState {
  const state = inject(planKey)
  if (!state) throw new Error('This belongs inside a page that provides a plan.')
  return state
}

/** What the server said of a plan: a ranking, or why there is none. */
export interface RankingReply {
  answer: RankingAnswer | null
  /** what the answer was asked for: the words may have gone on since */
  asked: { ownMassKg: number | null, target: number }
  problem: string | null
  issues: Issue[]
}
