import type { Database } from '../db/client'
import { fitIdFor, insertFit } from '../db/queries/fits'
import { publishedPulls } from '../db/queries/pulls'
import { runRefit } from './fitWorker'

/**
 * Fits the published pulls in a worker thread and stores the fit whole in one transaction; hands back its number.
 * The same data under the same model were fitted before: nothing new is stored, so a repeated job is harmless.
 */
export async function refit(db: Database, signal?: AbortSignal): Promise<number | null> {
  const pulls = await publishedPulls(db)
  if (!pulls.some(pull => pull.set)) return null
  const fit = await runRefit(pulls, signal)
  return db.transaction(async tx => await fitIdFor(tx, fit.modelVersion, fit.dataHash) ?? await insertFit(tx, fit))
}
