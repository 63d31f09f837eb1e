import { modelVersion } from '#shared/holding/version'
import type { ReleaseOrder } from '#shared/schemas/release'
import { dataHash } from '#shared/trial/canonical'
import { pullRecord } from '#shared/trial/pullRecord'
import type { PullRecord } from '#shared/types/holding'
import type { DescribedRows, ReleasePull } from '#shared/types/release'
import type { Database } from '../db/client'
import { describe } from '../db/queries/described'
import { fitIdFor, insertFit, lockFits, readFit } from '../db/queries/fits'
import { insertRelease, pullIdsAt, pullsOf, releaseOf } from '../db/queries/releases'
import { runRefit } from './fitWorker'
import { buildRelease } from './release/package'

/** The pulls of a release that stand, as the fit takes them. */
function recordsOf(pulls: readonly ReleasePull[], { designs, rigs, trials }: DescribedRows): PullRecord[] {
  const families = new Map(designs.map(({ slug, family }) => [slug, family]))
  const rigBySlug = new Map(rigs.map(rig => [rig.slug, rig]))
  const rigOf = new Map(trials.map(({ slug, rig }) => [slug, rigBySlug.get(rig)]))
  return pulls.filter(({ supersededBy }) => supersededBy === null).map((pull) => {
    const [family, rig] = [families.get(pull.design), rigOf.get(pull.trial)]
    if (!family || !rig) throw new Error(`the pull ${pull.pull} names what is not described`)
    return pullRecord(pull, { family, rig: rig.slug, calibrationSd: rig.calibrationSd })
  })
}

/**
 * Makes a release: freezes the pulls published by `cutAt`, fits exactly those in a worker thread unless they were fitted before, and stores
 * release, fit and estimates in one transaction. The fit does not become the one that readers are answered from.
 * A version that is there already stays as it is: a repeated job is harmless.
 *
 * @returns the release's hash
 * @throws Error where no pull had been published by then, or the moment has not come
 */
export async function makeRelease(db: Database, { version, cutAt, notes }: ReleaseOrder, signal?: AbortSignal, run: typeof runRefit = runRefit): Promise<string> {
  const made = await releaseOf(db, version)
  if (made) return made.hash
  const pullIds = await pullIdsAt(db, cutAt)
  const [pulls, described] = [await pullsOf(db, pullIds), await describe(db, pullIds)]
  const records = recordsOf(pulls, described)
  if (!records.some(({ set }) => set)) throw new Error(`release ${version} needs pulls published by ${cutAt}: there are none`)
  const fitted = await fitIdFor(db, modelVersion, dataHash(records)) === null ? await run(records, signal) : null
  return db.transaction(async (tx) => {
    await lockFits(tx)
    const fitId = await fitIdFor(tx, modelVersion, dataHash(records)) ?? (fitted && await insertFit(tx, fitted))
    const fit = fitId === null ? null : await readFit(tx, fitId)
    if (!fit || fitId === null) throw new Error(`release ${version} has lost its fit`)
    const { files, hash } = buildRelease({ version, cutAt: new Date(cutAt).toISOString(), notes, pulls, described, fit })
    await insertRelease(tx, { version, cutAt, fitId, hash, notes, pullIds, described, files: files.map(({ body: _body, ...file }) => file) })
    return hash
  })
}
