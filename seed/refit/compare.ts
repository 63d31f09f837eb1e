// Holds a fit of a release's pulls against the estimates that the release publishes.
import type { DesignEstimate, HoldingFit, Share } from '../../shared/types/holding'
import { figure, number, tableOf, text, type Downloaded, type Row } from './read'

/** One figure that both give: what it is, as published and as refitted; null where there is none. */
export interface Compared { what: string, published: number | null, refitted: number | null }

const shareColumns = (name: string, share: Share | null): [string, number | null][] =>
  (['mean', 'low90', 'high90', 'n'] as const).map(part => [`${name}_share_${part}`, share?.[part] ?? null])

const estimateColumns = (estimate: DesignEstimate): [string, number | null][] => [
  ['ln_mean_15kg', estimate.lnMean15Kg], ['ln_sd', estimate.lnSd], ['pulls', estimate.pulls], ['days', estimate.days], ['at_limit', estimate.atLimit],
  ['least_mass_kg', estimate.massRangeKg?.[0] ?? null], ['greatest_mass_kg', estimate.massRangeKg?.[1] ?? null], ['most_shown_15kg_n', estimate.mostShown15KgN],
  ...shareColumns('set', estimate.setShare), ...shareColumns('reset', estimate.resetShare), ...shareColumns('veer', estimate.veerShare),
]

/** Finds rows by the columns that name them, and pairs their cells with refitted figures; every row must be met once. */
function against(rows: readonly Row[], table: string, key: readonly string[]) {
  const found = new Map(rows.map(row => [key.map(column => text(row, column)).join(' '), row]))
  return {
    pair(names: readonly (string | number)[], columns: readonly [string, number | null][]): Compared[] {
      const name = names.join(' ')
      const row = found.get(name)
      if (!row) throw new Error(`the table ${table} lacks ${name}`)
      found.delete(name)
      return columns.map(([column, refitted]) => ({ what: `${table}: ${column} of ${name}`, published: number(row, column), refitted }))
    },
    close() {
      if (found.size > 0) throw new Error(`the table ${table} has ${[...found.keys()].slice(0, 3).join(', ')}, which the refit has not`)
    },
  }
}

function covarianceOf(fit: HoldingFit, release: Downloaded): Compared[] {
  return tableOf(release, 'covariances').map((row) => {
    const seabed = fit.seabeds.find(part => part.seabed === text(row, 'seabed'))
    const [r, c] = [figure(row, 'row'), figure(row, 'column')]
    const width = (seabed?.designs.length ?? 0) + 1
    return { what: `covariances: ${text(row, 'seabed')} ${r} ${c}`, published: figure(row, 'covariance'), refitted: seabed?.covariance[(r - 1) * width + c - 1] ?? null }
  })
}

/** Every figure of every table of estimates beside the refit's. @throws Error where one has a row that the other lacks */
export function compare(release: Downloaded, fit: HoldingFit): Compared[] {
  const estimates = against(tableOf(release, 'estimates'), 'estimates', ['seabed', 'design'])
  const ratios = against(tableOf(release, 'modification_estimates'), 'modification_estimates', ['modification', 'design', 'seabed'])
  const exponents = against(tableOf(release, 'exponents'), 'exponents', ['seabed'])
  const spreads = against(tableOf(release, 'spreads'), 'spreads', ['term'])
  const pairs = [
    ...fit.seabeds.flatMap(({ seabed, designs }) => designs.flatMap(one => estimates.pair([seabed, one.design], estimateColumns(one)))),
    ...fit.modifications.flatMap(one => ratios.pair([one.modification, one.design, one.seabed], [['ln_ratio', one.lnRatio], ['ln_sd', one.lnSd], ['pulls', one.pulls], ['pairs', one.pairs]])),
    ...fit.seabeds.flatMap(one => exponents.pair([one.seabed], [['exponent', one.exponent], ['beta_mean', one.betaMean]])),
    ...Object.entries({ ...fit.sds, pull: fit.sigma }).flatMap(([term, sd]) => spreads.pair([term], [['sd', sd]])),
    ...covarianceOf(fit, release),
  ]
  for (const table of [estimates, ratios, exponents, spreads]) table.close()
  return pairs
}

/** How far two figures are apart; infinitely where only one is there, or where one is no number. */
export function distance({ published, refitted }: Compared): number {
  if (published === null || refitted === null) return published === refitted ? 0 : Infinity
  const apart = Math.abs(published - refitted)
  return Number.isNaN(apart) ? Infinity : apart
}
