import { readiness } from '../services/application'

/** Ready: the database is reachable and migrated, and a fit is there to answer from. */
export default defineEventHandler(async (event) => {
  setHeader(event, 'Cache-Control', 'no-store')
  const state = await readiness()
  const ready = state.database && state.migrated && state.fit
  if (!ready) {
    setResponseStatus(event, 503)
    setHeader(event, 'Retry-After', 1)
  }
  return { ready, ...state }
})
