import type { Database } from '../db/client'
import { fitIdFor, insertFit, letStand, lockFits, newestFitId } from '../db/queries/fits'
import { publishedMark, publishedPulls } from '../db/queries/pulls'
import { runRefit } from './fitWorker'

/**
 * Fits the published pulls in a worker thread, stores the fit whole in one transaction and lets it stand; hands back its number.
 * Where the same data under the same model were fitted before, that fit stands (again): a repeated job is harmless.
 * Where the pulls have changed meanwhile, the fit is stored but does not stand: whatever changed them has asked for a refit of its own.
 */
export async function refit(db: Database, signal?: AbortSignal): Promise<number | null> {
  const mark = await publishedMark(db)
  const pulls = await publishedPulls(db)
  if (!pulls.some(pull => pull.set)) return null
  const fit = await runRefit(pulls, signal)
  return db.transaction(async (tx) => {
    await lockFits(tx)
    const id = await fitIdFor(tx, fit.modelVersion, fit.dataHash) ?? await insertFit(tx, fit)
    if (mark === await publishedMark(tx) && id !== await newestFitId(tx)) await letStand(tx, id)
    return id
  })
}
