import { createHash } from 'node:crypto'
import { isOpen } from '#shared/access/openFrom'
import { mayRead, type Actor } from '#shared/access/mayRead'
import type { Database } from '../db/client'
import { readFit } from '../db/queries/fits'
import { pullsOf, releaseOf } from '../db/queries/releases'
import { ApiError } from '../utils/errors'
import { database } from './application'
import { buildRelease, type BuiltFile } from './release/package'

/** A release rebuilt from the database does not have the hash that was stored when it was made. */
export class ReleaseChanged extends Error {}

interface Rebuilt { version: string, cutAt: string, hash: string, files: BuiltFile[] }

/**
 * Builds a release again from the pulls, names and estimates in the database; null where there is none of that version.
 *
 * @throws ReleaseChanged where it is not byte for byte the one that was made
 */
export async function rebuildRelease(db: Database, version: string): Promise<Rebuilt | null> {
  const stored = await releaseOf(db, version)
  if (!stored) return null
  const [pulls, fit] = [await pullsOf(db, stored.pullIds), await readFit(db, stored.fitId)]
  if (!fit) throw new ReleaseChanged(`release ${version} has lost its fit ${stored.fitId}`)
  const { files, hash } = buildRelease({ ...stored, pulls, fit })
  if (hash !== stored.hash) throw new ReleaseChanged(`release ${version} was made with hash ${stored.hash} and now builds with ${hash}: it is not served`)
  for (const file of files) {
    const told = stored.files.find(({ name }) => name === file.name)
    if (told?.sha256 !== file.sha256) throw new ReleaseChanged(`${file.name} of release ${version} was made with hash ${told?.sha256} and now builds with ${file.sha256}: it is not served`)
  }
  return { version, cutAt: stored.cutAt, hash, files }
}

/** The last few releases as built, or being built: a reader who takes every file has it built once. */
const kept = new Map<string, Promise<Rebuilt | null>>()
const mostKept = 3

function keptRelease(version: string): Promise<Rebuilt | null> {
  const known = kept.get(version)
  if (known) return known
  const building = rebuildRelease(database(), version)
  kept.set(version, building)
  for (const name of [...kept.keys()].slice(0, -mostKept)) kept.delete(name)
  const forget = () => {
    if (kept.get(version) === building) kept.delete(version)
  }
  building.then(built => built ?? forget(), forget)
  return building
}

export interface ServedFile { name: string, body: Buffer, sha256: string, open: boolean }

/**
 * A file of a release, its bytes checked against the hash that was stored when it was made.
 *
 * @throws ApiError 404 where there is no such release or file, 403 where the actor may not read it
 * @throws ReleaseChanged where the bytes are not those that were made
 */
export async function releaseFile(actor: Actor, version: string, name: string): Promise<ServedFile> {
  const release = await keptRelease(version)
  const file = release?.files.find(one => one.name === name)
  if (!release || !file) throw new ApiError(404, 'notFound', 'There is no such file of a release')
  const open = isOpen(release.cutAt, new Date())
  const ability = mayRead(actor, { what: 'release', version, open })
  if (!ability.allowed) throw new ApiError(404, 'notFound', ability.reason)
  if (createHash('sha256').update(file.body).digest('hex') !== file.sha256) throw new ReleaseChanged(`${name} of release ${version} changed in memory: it is not served`)
  return { name, body: file.body, sha256: file.sha256, open }
}
