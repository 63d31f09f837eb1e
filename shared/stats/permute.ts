import type { MixedModel } from '#shared/stats/mixedModel'

/** The same model with its effects renumbered: effect k becomes effect position[k]. */
export function permute(model: MixedModel, position: Int32Array): MixedModel {
  const cols = new Int32Array(model.cols.length)
  const coefs = new Float64Array(model.coefs.length)
  for (let i = 0; i < model.lo.length; i++) {
    const from = model.rowStart[i]!
    const row = Array.from(model.cols.subarray(from, model.rowStart[i + 1]!), (col, t) => ({ col: position[col]!, coef: model.coefs[from + t]! }))
    row.sort((a, b) => a.col - b.col)
    row.forEach(({ col, coef }, t) => {
      cols[from + t] = col
      coefs[from + t] = coef
    })
  }
  const group = new Int32Array(model.group.length)
  const priorSd = new Float64Array(model.group.length)
  const maximised = new Uint8Array(model.group.length)
  position.forEach((place, k) => {
    group[place] = model.group[k]!
    priorSd[place] = model.priorSd[k]!
    maximised[place] = model.maximised[k]!
  })
  return { ...model, cols, coefs, group, priorSd, maximised }
}
