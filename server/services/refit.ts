import type { Database } from '../db/client'
import { fitIdFor, insertFit, letStand, newestFitId } from '../db/queries/fits'
import { publishedPulls } from '../db/queries/pulls'
import { runRefit } from './fitWorker'

/**
 * Fits the published pulls in a worker thread, stores the fit whole in one transaction and lets it stand; hands back its number.
 * Where the same data under the same model were fitted before, that fit stands (again): a repeated job is harmless.
 */
export async function refit(db: Database, signal?: AbortSignal): Promise<number | null> {
  const pulls = await publishedPulls(db)
  if (!pulls.some(pull => pull.set)) return null
  const fit = await runRefit(pulls, signal)
  return db.transaction(async (tx) => {
    const id = await fitIdFor(tx, fit.modelVersion, fit.dataHash) ?? await insertFit(tx, fit)
    if (id !== await newestFitId(tx)) await letStand(tx, id)
    return id
  })
}
