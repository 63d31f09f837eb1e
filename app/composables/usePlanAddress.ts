import type { PlanState } from '~/composables/usePlanState'

const pauseMs = 350

/** Keeps the address and the words the same: typing rewrites the address, and an address opened from elsewhere rewrites the words. */
export function usePlanAddress(state: PlanState): void {
  const route = useRoute()
  const router = useRouter()
  const write = (query: object): string => router.resolve({ path: route.path, query: { ...query } }).fullPath
  let own = write(route.query)
  let pause: ReturnType<typeof setTimeout> | undefined

  watch(state.query, (query) => {
    clearTimeout(pause)
    pause = setTimeout(() => {
      const next = router.resolve({ path: '/plan', query })
      own = next.fullPath
      if (route.path === '/plan' && route.fullPath !== own) router.replace({ path: '/plan', query })
    }, pauseMs)
  })
  watch(() => route.fullPath, (fullPath) => {
    if (route.path === '/plan' && fullPath !== own) {
      own = fullPath
      state.load(route.query)
    }
  })
  onScopeDispose(() => clearTimeout(pause))
}
