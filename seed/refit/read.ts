// Reads a downloaded release: its description, its tables checked against their hashes, its pulls as the fit takes them.
import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { pullRecord } from '../../shared/trial/pullRecord'
import type { PullRecord } from '../../shared/types/holding'
import type { ReleasePull } from '../../shared/types/release'
import type { Family } from '../../shared/types/words'
import { readRecords } from '../../shared/utils/csv'

export type Row = Record<string, string>

export interface Descriptor { version: string, title: string, fit: { modelVersion: string, dataHash: string }, resources: { name: string, path: string, hash: string }[] }

export interface Downloaded { descriptor: Descriptor, hash: string, tables: Map<string, Row[]> }

const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex')

/** Where a release's files are read from: a folder, or a server and a version. */
export function sourceOf(place: string, version?: string): (name: string) => Promise<Uint8Array> {
  if (!/^https?:\/\//.test(place)) return name => readFile(join(place, name))
  if (version === undefined) throw new Error('a server needs the version of a release beside it, such as 2026')
  return async (name) => {
    const answer = await fetch(`${place.replace(/\/+$/, '')}/api/releases/${version}/${name}`)
    if (!answer.ok) throw new Error(`${name} could not be had: the server answers ${answer.status}`)
    return new Uint8Array(await answer.arrayBuffer())
  }
}

/** Reads every table that the description names. @throws Error naming a file whose bytes are not those described */
export async function download(source: (name: string) => Promise<Uint8Array>): Promise<Downloaded> {
  const bytes = await source('datapackage.json')
  const descriptor = JSON.parse(new TextDecoder().decode(bytes)) as Descriptor
  const tables = new Map<string, Row[]>()
  for (const { name, path, hash } of descriptor.resources) {
    if (!/^[a-z0-9_]+\.csv$/.test(path)) throw new Error(`a table must be a file beside its description, got ${path}`)
    const body = await source(path)
    if (`sha256:${sha256(body)}` !== hash) throw new Error(`${path} is not the file that datapackage.json describes: its SHA-256 is ${sha256(body)}`)
    tables.set(name, readRecords(new TextDecoder().decode(body)))
  }
  return { descriptor, hash: sha256(bytes), tables }
}

export const text = (row: Row, column: string) => {
  const value = row[column]
  if (value === undefined) throw new Error(`the column ${column} is missing`)
  return value
}

/** A number of a table; null where the cell is empty. */
export function number(row: Row, column: string): number | null {
  const value = text(row, column)
  if (value === '') return null
  if (!Number.isFinite(Number(value))) throw new Error(`${column} must be a number, got ${value}`)
  return Number(value)
}

export function figure(row: Row, column: string): number {
  const value = number(row, column)
  if (value === null) throw new Error(`${column} must not be empty`)
  return value
}

const word = <Word extends string>(row: Row, column: string) => text(row, column) as Word
const wordOrNull = <Word extends string>(row: Row, column: string) => text(row, column) === '' ? null : word<Word>(row, column)

function releasePull(row: Row): ReleasePull {
  return {
    pull: text(row, 'pull'), trial: text(row, 'trial'), ordinal: figure(row, 'ordinal'), design: text(row, 'design'), massKg: figure(row, 'mass_kg'),
    modification: wordOrNull(row, 'modification'), anchorSetting: wordOrNull(row, 'anchor_setting'), pair: wordOrNull(row, 'pair'), seabed: word(row, 'seabed'),
    setting: word(row, 'setting'), firstTry: text(row, 'first_try') === 'true', fresh: text(row, 'fresh') === 'true', heldN: figure(row, 'held_n'), movedN: number(row, 'moved_n'),
    shankAngleDeg: figure(row, 'shank_angle_deg'), end: wordOrNull(row, 'ended'), creepMMin: number(row, 'creep_m_min'), after: wordOrNull(row, 'after'),
    veerDeg: number(row, 'veer_deg'), veer: wordOrNull(row, 'veer'), eastM: number(row, 'east_m'), northM: number(row, 'north_m'),
    attitude: text(row, 'attitude'), fouling: text(row, 'fouling'), condition: text(row, 'condition'), note: text(row, 'note'), supersededBy: null,
  }
}

export function tableOf({ tables }: Downloaded, name: string): Row[] {
  const rows = tables.get(name)
  if (!rows) throw new Error(`the release has no table ${name}`)
  return rows
}

/** The pulls that stand, as the fit takes them. */
export function pullsOf(release: Downloaded): PullRecord[] {
  const families = new Map(tableOf(release, 'designs').map(row => [text(row, 'design'), word<Family>(row, 'family')]))
  const rigs = new Map(tableOf(release, 'rigs').map(row => [text(row, 'rig'), number(row, 'calibration_sd')]))
  const rigOf = new Map(tableOf(release, 'trials').map(row => [text(row, 'trial'), text(row, 'rig')]))
  return tableOf(release, 'pulls').map(releasePull).map((pull) => {
    const [family, rig] = [families.get(pull.design), rigOf.get(pull.trial)]
    if (family === undefined || rig === undefined) throw new Error(`the pull ${pull.pull} names what the release does not describe`)
    return pullRecord(pull, { family, rig, calibrationSd: rigs.get(rig) ?? null })
  })
}
