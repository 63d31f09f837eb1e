import type { Laplace } from '#shared/stats/laplace'

/** Adds curvature of one observation between its effects. */
function addObservation(laplace: Laplace, i: number): void {
  const { model, structure, curvature } = laplace
  const { rowStart, cols, coefs } = model
  const { base, values } = structure.matrix
  const to = rowStart[i + 1]!
  for (let s = rowStart[i]!; s < to; s++) {
    const col = cols[s]!
    const weight = curvature[i]! * coefs[s]!
    for (let t = rowStart[i]!; t < to; t++) {
      if (cols[t]! <= col) values[base[col]! + cols[t]!]! += weight * coefs[t]!
    }
  }
}

/** Curvature of one day's effect, and between it and the other effects; then what is left once the day is eliminated. */
function eliminateDay(laplace: Laplace, d: number): void {
  const { model, structure, curvature, cross } = laplace
  const { dayStart, order, dayColStart, dayCols, slot, matrix } = structure
  const from = dayColStart[d]!
  const to = dayColStart[d + 1]!
  cross.fill(0, from, to)
  let own = laplace.dayPrecision
  for (let m = dayStart[d]!; m < dayStart[d + 1]!; m++) {
    const i = order[m]!
    own += curvature[i]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) cross[slot[t]!]! += curvature[i]! * model.coefs[t]!
  }
  laplace.dayCurvature[d] = own
  for (let s = from; s < to; s++) {
    const row = matrix.base[dayCols[s]!]!
    const share = cross[s]! / own
    for (let t = from; t <= s; t++) matrix.values[row + dayCols[t]!]! -= share * cross[t]!
  }
}

/**
 * Fills the matrix with the negative Hessian of the objective in the effects, the day effects eliminated (their Schur
 * complement): their block is diagonal, so this is one division a day.
 */
export function assemble(laplace: Laplace): void {
  const { model, structure, precision } = laplace
  const { base, values } = structure.matrix
  values.fill(0)
  for (let k = 0; k < precision.length; k++) values[base[k]! + k] = precision[k]!
  for (let i = 0; i < model.lo.length; i++) addObservation(laplace, i)
  for (let d = 0; d < model.days; d++) eliminateDay(laplace, d)
}
