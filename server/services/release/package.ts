import { createHash } from 'node:crypto'
import { openFrom } from '#shared/access/openFrom'
import type { HoldingFit } from '#shared/types/holding'
import type { DescribedRows, ReleaseFile, ReleasePull } from '#shared/types/release'
import { writeCsv } from '#shared/utils/csv'
import * as described from './described'
import * as fitted from './estimates'
import * as pulled from './pulls'
import { fill, type FilledTable } from './table'
import { tar } from './tar'

/** All that a release is made of. */
export interface ReleaseContents { version: string, cutAt: string, notes: string, pulls: readonly ReleasePull[], described: DescribedRows, fit: HoldingFit }

export interface BuiltFile extends ReleaseFile { body: Buffer }

export const licence = { name: 'CC-BY-4.0', title: 'Creative Commons Attribution 4.0 International', path: 'https://creativecommons.org/licenses/by/4.0/' }

export const isInvented = ({ designs, rigs, trials }: DescribedRows) => [...designs, ...rigs, ...trials].some(({ invented }) => invented)

const dayOf = (moment: string) => moment.slice(0, 10)
const sha256 = (body: Buffer) => createHash('sha256').update(body).digest('hex')

/** How to name a release in a text that rests on it. */
export function citation({ version, cutAt, described: rows }: Pick<ReleaseContents, 'version' | 'cutAt' | 'described'>): string {
  const testers = [...new Set(rows.trials.map(({ tester }) => tester))].sort().join('; ')
  const what = isInvented(rows) ? 'Invented demonstration data, nothing was measured.' : 'Anchor pulls and holding estimates.'
  return `${testers}. Kedgewise data, release ${version}, pulls published by ${dayOf(cutAt)}. ${what} ${licence.name}.`
}

function tablesOf({ pulls, described: rows, fit }: ReleaseContents): FilledTable[] {
  return [
    fill(pulled.pulls, pulls.filter(({ supersededBy }) => supersededBy === null)),
    fill(pulled.supersededPulls, pulls.filter(({ supersededBy }) => supersededBy !== null)),
    fill(described.trials, rows.trials),
    fill(described.rigs, rows.rigs),
    fill(described.rigSteps, described.stepsOf(rows.rigs)),
    fill(described.designs, rows.designs),
    fill(described.sizes, rows.sizes),
    fill(described.modifications, rows.modifications),
    fill(described.seabeds, rows.seabeds),
    fill(fitted.estimates, fitted.estimatesOf(fit)),
    fill(fitted.modificationEstimates, fit.modifications),
    fill(fitted.exponents, fit.seabeds),
    fill(fitted.covariances, fitted.covarianceEntries(fit)),
    fill(fitted.spreads, fitted.spreadsOf(fit)),
  ]
}

function builtFile(name: string, title: string, rows: number | null, body: Buffer): BuiltFile {
  return { name, title, rows, bytes: body.length, sha256: sha256(body), body }
}

function resource({ name, title, key, refers, fields }: FilledTable, { bytes, sha256: hash }: BuiltFile) {
  return {
    name, title, type: 'table', path: `${name}.csv`, scheme: 'file', format: 'csv', mediatype: 'text/csv', encoding: 'utf-8', bytes, hash: `sha256:${hash}`,
    dialect: { delimiter: ',', lineTerminator: '\r\n', quoteChar: '"', doubleQuote: true, header: true },
    schema: {
      fields, missingValues: [''], primaryKey: key,
      ...(refers.length > 0 && { foreignKeys: refers.map(([from, table, to]) => ({ fields: [from], reference: { resource: table, fields: [to] } })) }),
    },
  }
}

/** The description of the whole, by the Data Package standard of Frictionless Data; it holds the hash of every table. */
function descriptor(contents: ReleaseContents, resources: object[]): string {
  const { version, cutAt, notes, described: rows, fit } = contents
  const opens = dayOf(openFrom(cutAt))
  const invented = isInvented(rows)
  return `${JSON.stringify({
    $schema: 'https://datapackage.org/profiles/2.0/datapackage.json',
    name: `kedgewise-${version}`,
    title: `Kedgewise data, release ${version}${invented ? ' (invented demonstration data)' : ''}`,
    description: [
      ...(invented ? ['Everything in this release is invented for a demonstration: no such anchor, place, vessel or tester exists, and nothing was measured.'] : []),
      notes,
      `The pulls published by ${cutAt} with the corrections known by then, what they name, and the fit of exactly those pulls. SI units; the unit of a column ends its name and is its "unit" (UCUM). Estimates come from short pulls on someone else's bottom: not a promise.`,
    ].filter(text => text !== '').join('\n\n'),
    version,
    created: cutAt,
    licenses: [{ ...licence, title: `${licence.title}, from ${opens} on` }],
    openFrom: opens,
    contributors: [...new Set(rows.trials.map(({ tester }) => tester))].sort().map(title => ({ title, roles: ['DataCollector'] })),
    citation: citation(contents),
    invented,
    fit: { modelVersion: fit.modelVersion, dataHash: fit.dataHash },
    resources,
  }, null, 2)}\n`
}

/**
 * The files of a release, in a fixed order: the description first, then the tables, then one archive of them all. The same contents give
 * the same bytes. The hash of the description stands for the whole release.
 */
export function buildRelease(contents: ReleaseContents): { files: BuiltFile[], hash: string } {
  const tables = tablesOf(contents).map((table) => {
    const text = writeCsv(table.fields.map(({ name }) => name), table.rows)
    return { table, file: builtFile(`${table.name}.csv`, table.title, table.rows.length, Buffer.from(text)) }
  })
  const text = descriptor(contents, tables.map(({ table, file }) => resource(table, file)))
  const description = builtFile('datapackage.json', 'Description of every table and field', null, Buffer.from(text))
  const files = [description, ...tables.map(({ file }) => file)]
  const name = `kedgewise-${contents.version}`
  const archive = tar(files.map(file => ({ name: `${name}/${file.name}`, body: file.body })), new Date(contents.cutAt))
  return { files: [...files, builtFile(`${name}.tar`, 'All of these in one archive', null, archive)], hash: description.sha256 }
}

const nothing: ReleaseContents = {
  version: '0', cutAt: '2000-01-01T00:00:00.000Z', notes: '', pulls: [],
  described: { seabeds: [], designs: [], sizes: [], modifications: [], rigs: [], trials: [] },
  fit: { modelVersion: '', dataHash: '', sigma: 0, sds: { family: 0, design: 0, designSeabed: 0, modification: 0, modificationSeabed: 0, trial: 0, anchorDay: 0 }, seabeds: [], modifications: [] },
}

/** Names the form of releases by the hash of an empty one: it changes with every column, word or bound of the tables and their description. */
export const releaseForm = (): string => buildRelease(nothing).hash
