import type { Laplace } from '#shared/stats/laplace'

/** Curvature of each class of like observations, added up. */
function classCurvatures(laplace: Laplace): Float64Array {
  const { curvature, structure } = laplace
  const sums = new Float64Array(structure.example.length)
  for (let i = 0; i < curvature.length; i++) sums[structure.classOf[i]!]! += curvature[i]!
  return sums
}

/** Adds a class's curvature between its effects. */
function addClass(laplace: Laplace, i: number, sum: number): void {
  const { rowStart, cols, coefs } = laplace.model
  const { size, values } = laplace.structure.matrix
  const from = rowStart[i]!
  const to = rowStart[i + 1]!
  for (let s = from; s < to; s++) {
    const row = cols[s]! * size
    const weight = sum * coefs[s]!
    for (let t = from; t <= s; t++) values[row + cols[t]!]! += weight * coefs[t]!
  }
}

/** Curvature of one day's effect, and between it and the other effects; then what is left once the day is eliminated. */
function eliminateDay(laplace: Laplace, d: number, sums: Float64Array): void {
  const { model, structure, cross } = laplace
  const { dayClass, example, dayColStart, dayCols, slot, matrix } = structure
  const from = dayColStart[d]!
  const to = dayColStart[d + 1]!
  cross.fill(0, from, to)
  let own = laplace.dayPrecision
  for (let c = dayClass[d]!; c < dayClass[d + 1]!; c++) {
    const i = example[c]!
    own += sums[c]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) cross[slot[t]!]! += sums[c]! * model.coefs[t]!
  }
  laplace.dayCurvature[d] = own
  for (let s = from; s < to; s++) {
    const row = dayCols[s]! * matrix.size
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
  const { size, values } = structure.matrix
  const sums = classCurvatures(laplace)
  values.fill(0)
  for (let k = 0; k < precision.length; k++) values[k * size + k] = precision[k]!
  for (let c = 0; c < sums.length; c++) addClass(laplace, structure.example[c]!, sums[c]!)
  for (let d = 0; d < model.days; d++) eliminateDay(laplace, d, sums)
}
