import type { DesignEstimate, HoldingFit, ModificationEstimate, SeabedFit, Share } from '#shared/types/holding'
import { families, numberedSeabeds } from '#shared/types/words'
import { column, type Column, type Table } from './table'

/** Half width of a 90 % interval in standard deviations. */
const z90 = 1.6448536269514722

interface Estimate extends DesignEstimate { seabed: string }

const holding = ({ lnMean15Kg, lnSd }: Estimate, sds: number) => Math.exp(lnMean15Kg + sds * lnSd)

function shareColumns(name: string, what: string, share: (row: Estimate) => Share | null): Column<Estimate>[] {
  const bounds = { minimum: 0, maximum: 1, unit: '1', optional: true } as const
  return [
    column(`${name}_share_mean`, 'number', `share that ${what}: mean; empty: never tested`, row => share(row)?.mean ?? null, bounds),
    column(`${name}_share_low90`, 'number', `share that ${what}: lower end of the 90 % interval`, row => share(row)?.low90 ?? null, bounds),
    column(`${name}_share_high90`, 'number', `share that ${what}: upper end of the 90 % interval`, row => share(row)?.high90 ?? null, bounds),
    column(`${name}_share_n`, 'integer', `share that ${what}: count behind it`, row => share(row)?.n ?? null, { minimum: 0, optional: true }),
  ]
}

export const estimates: Table<Estimate> = {
  name: 'estimates', title: 'Estimates: what the fit says of each design on each seabed', key: ['seabed', 'design'], refers: [['seabed', 'seabeds', 'seabed'], ['design', 'designs', 'design']],
  columns: [
    column('seabed', 'string', 'seabed', row => row.seabed, { enum: numberedSeabeds }),
    column('design', 'string', 'design', row => row.design),
    column('family', 'string', 'family', row => row.family, { enum: families }),
    column('ln_mean_15kg', 'number', 'mean of ln(holding in N) at 15 kg, flat pull, perfect rig', row => row.lnMean15Kg, { unit: '1' }),
    column('ln_sd', 'number', 'its standard deviation', row => row.lnSd, { unit: '1', minimum: 0 }),
    column('median_n', 'number', 'median holding at 15 kg, from the two above', row => holding(row, 0), { unit: 'N', minimum: 0 }),
    column('low90_n', 'number', 'lower end of its 90 % interval', row => holding(row, -z90), { unit: 'N', minimum: 0 }),
    column('high90_n', 'number', 'upper end of its 90 % interval', row => holding(row, z90), { unit: 'N', minimum: 0 }),
    column('pulls', 'integer', 'pulls behind it; 0: never pulled here, from its family', row => row.pulls, { minimum: 0 }),
    column('days', 'integer', 'days they were made on', row => row.days, { minimum: 0 }),
    column('at_limit', 'integer', 'of them at the rig\'s limit', row => row.atLimit, { minimum: 0 }),
    column('least_mass_kg', 'number', 'smallest mass pulled here', row => row.massRangeKg?.[0] ?? null, { unit: 'kg', optional: true }),
    column('greatest_mass_kg', 'number', 'greatest mass pulled here', row => row.massRangeKg?.[1] ?? null, { unit: 'kg', optional: true }),
    column('most_shown_15kg_n', 'number', 'most that any pull here held, scaled to 15 kg and a flat pull', row => row.mostShown15KgN, { unit: 'N', optional: true }),
    ...shareColumns('set', 'set at the first try', row => row.setShare),
    ...shareColumns('reset', 'reset after a breakout', row => row.resetShare),
    ...shareColumns('veer', 'stayed buried or reset when the load was turned', row => row.veerShare),
  ],
}

export const estimatesOf = (fit: HoldingFit): Estimate[] => fit.seabeds.flatMap(({ seabed, designs }) => designs.map(design => ({ ...design, seabed })))

export const modificationEstimates: Table<ModificationEstimate> = {
  name: 'modification_estimates', title: 'Ratio of a modified anchor\'s holding to its own unmodified', key: ['modification', 'design', 'seabed'],
  refers: [['modification', 'modifications', 'modification'], ['design', 'designs', 'design'], ['seabed', 'seabeds', 'seabed']],
  columns: [
    column('modification', 'string', 'modification', row => row.modification),
    column('design', 'string', 'design', row => row.design),
    column('seabed', 'string', 'seabed', row => row.seabed, { enum: numberedSeabeds }),
    column('ln_ratio', 'number', 'mean of ln(modified over unmodified)', row => row.lnRatio, { unit: '1' }),
    column('ln_sd', 'number', 'its standard deviation', row => row.lnSd, { unit: '1', minimum: 0 }),
    column('pulls', 'integer', 'modified pulls in the fit', row => row.pulls, { minimum: 0 }),
    column('pairs', 'integer', 'back-to-back pairs', row => row.pairs, { minimum: 0 }),
    column('verdict', 'string', 'verdict; empty: no pairs, so none is given', row => row.verdict, { enum: ['better', 'worse', 'noDifference', 'cannotTell'], optional: true }),
  ],
}

export const exponents: Table<SeabedFit> = {
  name: 'exponents', title: 'Exponent of the mass on each seabed', key: ['seabed'], refers: [['seabed', 'seabeds', 'seabed']],
  columns: [
    column('seabed', 'string', 'seabed', row => row.seabed, { enum: numberedSeabeds }),
    column('exponent', 'number', 'exponent published for its soil kind', row => row.exponent, { unit: '1' }),
    column('beta_mean', 'number', 'what the pulls add to it: mean', row => row.betaMean, { unit: '1' }),
  ],
}

/** The name under which the exponent stands among the designs of a covariance. */
export const betaName = '(exponent)'

interface Entry { seabed: string, row: number, column: number, first: string, second: string, covariance: number }

/** The upper triangles, diagonals included. */
export function covarianceEntries(fit: HoldingFit): Entry[] {
  return fit.seabeds.flatMap(({ seabed, designs, covariance }) => {
    const names = [...designs.map(({ design }) => design), betaName]
    return names.flatMap((first, row) => names.slice(row).map((second, offset) =>
      ({ seabed, row: row + 1, column: row + offset + 1, first, second, covariance: covariance[row * names.length + row + offset] ?? Number.NaN })))
  })
}

export const covariances: Table<Entry> = {
  name: 'covariances', title: 'Joint covariance of the designs\' ln holding on each seabed', key: ['seabed', 'row', 'column'], refers: [['seabed', 'seabeds', 'seabed']],
  columns: [
    column('seabed', 'string', 'seabed', row => row.seabed, { enum: numberedSeabeds }),
    column('row', 'integer', 'row, from 1; only the upper triangle is given', row => row.row, { minimum: 1 }),
    column('column', 'integer', 'column, from 1', row => row.column, { minimum: 1 }),
    column('first', 'string', `design of the row, or ${betaName} for what the pulls add to the exponent`, row => row.first),
    column('second', 'string', 'the same of the column', row => row.second),
    column('covariance', 'number', 'covariance of ln holding at 15 kg', row => row.covariance, { unit: '1' }),
  ],
}

interface Spread { term: string, sd: number }

export const spreadsOf = ({ sds, sigma }: HoldingFit): Spread[] => [...Object.entries(sds).map(([term, sd]) => ({ term, sd: sd as number })), { term: 'pull', sd: sigma }]

export const spreads: Table<Spread> = {
  name: 'spreads', title: 'Spread of the model\'s random terms', key: ['term'],
  columns: [
    column('term', 'string', 'term of the model; pull: from one pull to the next', row => row.term, {
      enum: ['anchorDay', 'design', 'designSeabed', 'family', 'modification', 'modificationSeabed', 'pull', 'trial'],
    }),
    column('sd', 'number', 'standard deviation in ln load', row => row.sd, { unit: '1', minimum: 0 }),
  ],
}
