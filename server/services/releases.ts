import { isOpen, openFrom } from '#shared/access/openFrom'
import { mayRead, type Actor } from '#shared/access/mayRead'
import { movesBetween } from '#shared/holding/moves'
import type { ReleaseChanges, ReleaseListing, ReleasesAnswer } from '#shared/types/release'
import { holdingsOf, listReleases, type FittedHolding, type ListedRelease } from '../db/queries/releases'
import { ApiError } from '../utils/errors'
import { database } from './application'
import { citation, isInvented, licence } from './release/package'

/** 2026.10 after 2026.9: part by part, as numbers. */
function compareVersions(a: string, b: string): number {
  const [x, y] = [a.split('.').map(Number), b.split('.').map(Number)]
  for (let i = 0; i < Math.max(x.length, y.length); i++) {
    const difference = (x[i] ?? -1) - (y[i] ?? -1)
    if (difference !== 0) return difference
  }
  return 0
}

const rowsOf = ({ files }: ListedRelease, name: string) => files.find(file => file.name === name)?.rows ?? 0

/** What the later list names and the earlier does not. */
const newcomers = <One extends { slug: string }>(now: readonly One[], then: readonly One[]) =>
  now.filter(({ slug }) => !then.some(one => one.slug === slug)).sort((a, b) => a.slug < b.slug ? -1 : 1)

function changesOf(release: ListedRelease, before: ListedRelease | null, holdings: ReadonlyMap<number, FittedHolding[]>): ReleaseChanges {
  const [now, then] = [release.described, before?.described]
  const names = (rows: { slug: string, name: string }[]) => rows.map(({ slug, name }) => ({ slug, name }))
  const since = (name: string) => rowsOf(release, name) - (before ? rowsOf(before, name) : 0)
  const corrections = since('superseded_pulls.csv')
  return {
    since: before?.version ?? null,
    pulls: since('pulls.csv') + corrections,
    corrections,
    trials: newcomers(now.trials, then?.trials ?? []).map(({ slug }) => slug),
    designs: names(newcomers(now.designs, then?.designs ?? [])),
    modifications: names(newcomers(now.modifications, then?.modifications ?? [])),
    seabeds: newcomers(now.seabeds, then?.seabeds ?? []).map(({ slug }) => slug),
    ...movesBetween(before ? holdings.get(before.fitId) ?? [] : [], holdings.get(release.fitId) ?? []),
  }
}

function listing(release: ListedRelease, changes: ReleaseChanges, now: Date): ReleaseListing {
  const { version, cutAt, madeAt, notes, hash, files, modelVersion, dataHash, described } = release
  return {
    version, cutAt, madeAt, openFrom: openFrom(cutAt), open: isOpen(cutAt, now),
    licence: { name: licence.name, title: licence.title, url: licence.path },
    citation: citation(release), invented: isInvented(described), notes, hash, fit: { modelVersion, dataHash },
    pulls: rowsOf(release, 'pulls.csv'), files, changes,
  }
}

/** Every release that the actor may read, newest first, each with what changed since the one before. */
export async function releases(actor: Actor): Promise<ReleasesAnswer> {
  const all = (await listReleases(database())).sort((a, b) => compareVersions(a.version, b.version))
  const rows = await holdingsOf(database(), [...new Set(all.map(({ fitId }) => fitId))])
  const holdings = new Map<number, FittedHolding[]>()
  for (const row of rows) holdings.set(row.fitId, [...holdings.get(row.fitId) ?? [], row])
  const now = new Date()
  const listed = all.map((release, i) => listing(release, changesOf(release, all[i - 1] ?? null, holdings), now))
  return { releases: listed.filter(({ version, open }) => mayRead(actor, { what: 'release', version, open }).allowed).reverse() }
}

/** One release. @throws ApiError 404 where there is none of that version */
export async function release(actor: Actor, version: string): Promise<ReleaseListing> {
  const found = (await releases(actor)).releases.find(one => one.version === version)
  if (!found) throw new ApiError(404, 'notFound', 'There is no release of that version')
  return found
}
