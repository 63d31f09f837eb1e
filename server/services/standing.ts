import { ApiError } from '../utils/errors'
import { currentEvidence, type Evidence } from './evidence'

/** The evidence that answers rest on. @throws ApiError 503 while there is no fit yet */
export async function standingEvidence(): Promise<Evidence> {
  const evidence = await currentEvidence()
  if (evidence) return evidence
  throw new ApiError(503, 'noFitYet', 'The pulls have not been fitted yet: try again in a few seconds', { headers: { 'Retry-After': '5' } })
}
