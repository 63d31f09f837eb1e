import { usePreferencesStore } from '~/stores/preferences'
import { readMode, readUnits } from '~/utils/preferences'
import { safePath } from '~/utils/ownPath'

/**
 * Without JavaScript the choice of display and units is a plain form: it comes in the address, goes into the cookie, and the
 * reader is sent on to the same page without it, so that a shared address never carries somebody's preference.
 */
export default defineNuxtRouteMiddleware((to) => {
  const { display, units, ...query } = to.query
  if (display === undefined && units === undefined) return
  const preferences = usePreferencesStore()
  const mode = readMode(display)
  const habit = readUnits(units)
  if (mode) preferences.chooseMode(mode)
  if (habit) preferences.chooseUnits(habit)
  return navigateTo({ path: safePath(to.path), query }, { redirectCode: 303, replace: true })
})
