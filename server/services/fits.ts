import type { FitAnswer, FitRequest } from '#shared/types/fit'
import { ApiError, invalid } from '../utils/errors'
import { FitTimeout, runFit } from './fitWorker'
import { GaveUp, NoPlace, Turns } from './turns'

/** One fit at a time, four that wait. */
export const mostWaiting = 4
const retryAfterS = 15

const turns = new Turns(mostWaiting)

/**
 * What would these pulls say? Runs in a worker thread; nothing is stored.
 *
 * @param gone ends when nobody waits for the answer any more
 * @throws ApiError 429 where four wait already; 422 where the fit takes longer than its 30 s
 */
export async function fits(request: FitRequest, gone?: AbortSignal, run: typeof runFit = runFit, line: Turns = turns): Promise<FitAnswer> {
  try {
    return await line.run(() => run(request, gone), gone)
  }
  catch (error) {
    if (error instanceof NoPlace) {
      throw new ApiError(429, 'busy', `One fit runs and ${mostWaiting} wait: try again in ${retryAfterS} s`, { headers: { 'Retry-After': String(retryAfterS) } })
    }
    if (error instanceof GaveUp || gone?.aborted) throw new ApiError(503, 'busy', 'Nobody waits for this answer any more')
    if (error instanceof FitTimeout) throw invalid({ pulls: 'must be fewer: this fit takes longer than 30 s' })
    throw error
  }
}
