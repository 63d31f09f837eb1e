import { usePreferencesStore } from '~/stores/preferences'
import { showIn, type Show } from '~/utils/show'

/** Prints SI values in the reader's units. */
export function useShow(): Show {
  const preferences = usePreferencesStore()
  return showIn(computed(() => preferences.units))
}
