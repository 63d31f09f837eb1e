import { defineStore } from 'pinia'
import { readPreferences, writePreferences } from '~/utils/preferences'
import type { Mode } from '~/utils/preferences'
import type { UnitSystem } from '#shared/units/systems'

/** Display mode and unit habit. The cookie is written only when the reader chooses. */
export const usePreferencesStore = defineStore('preferences', () => {
  const cookie = useCookie<string | null>('preference', {
    maxAge: 365 * 24 * 3600, sameSite: 'lax', path: '/',
  })
  const chosen = computed(() => readPreferences(cookie.value))
  const mode = computed(() => chosen.value.mode)
  const units = computed(() => chosen.value.units)
  const colorScheme = computed(() => ({ system: 'light dark', day: 'light', sun: 'light', night: 'dark' })[mode.value])

  function chooseMode(next: Mode): void {
    cookie.value = writePreferences({ ...chosen.value, mode: next })
  }

  function chooseUnits(next: UnitSystem): void {
    cookie.value = writePreferences({ ...chosen.value, units: next })
  }

  return { mode, units, colorScheme, chooseMode, chooseUnits }
})
